using System.Numerics;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Parts;

/// <summary>One FRF of a measured part as its file holds it, read when it is needed.</summary>
public interface IFrfCurve
{
    Dof Response { get; }

    Dof Excitation { get; }

    /// <summary>What the values are; never <see cref="Quantity.Unknown"/>.</summary>
    FrfQuantity Quantity { get; }

    FrequencyAxis Axis { get; }

    /// <summary>Where the curve stands, for messages.</summary>
    SourceSpan Origin { get; }

    /// <summary>Reads the values in SI units, one per line of <see cref="Axis"/>.</summary>
    /// <returns>False after an error in <paramref name="diagnostics"/>.</returns>
    bool TryRead(Span<Complex> values, DiagnosticBag diagnostics);
}
