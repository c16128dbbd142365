using Boltup.Engine.Diagnostics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Parts;

/// <summary>One uncoupled part: something that can say its FRFs between its own dofs.</summary>
public interface IPartModel
{
    /// <summary>The lines at which the part has data, or null when it can be evaluated at any frequency.</summary>
    FrequencyAxis? Axis { get; }

    /// <summary>The dofs that can respond.</summary>
    IReadOnlyCollection<Dof> Responses { get; }

    /// <summary>The dofs that can be excited.</summary>
    IReadOnlyCollection<Dof> Excitations { get; }

    /// <summary>Whether this FRF is known, directly or by a reciprocity that the part allows.</summary>
    bool HasFrf(Dof response, Dof excitation);

    /// <summary>
    /// FRFs of the free part in the engine's quantity, rows × columns over the axis. Every pair must be known and every line
    /// within the band of <see cref="Axis"/>.
    /// </summary>
    /// <returns>The FRFs, or null after an error in <paramref name="diagnostics"/>.</returns>
    FrfMatrix? Evaluate(FrequencyAxis axis, IReadOnlyList<Dof> rows, IReadOnlyList<Dof> columns, DiagnosticBag diagnostics);
}
