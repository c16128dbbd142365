using System.Numerics;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Prediction;

/// <summary>Force spectra at dofs of one part, along the part's own dofs.</summary>
/// <param name="Part">Name of the part.</param>
/// <param name="Axis">Lines of the spectra.</param>
/// <param name="Dofs">Where the forces act.</param>
/// <param name="Spectra">For each dof one value per line, N or N·m (m³/s for a volume velocity).</param>
public sealed record ForceSet(
    ForceKind Kind, string Part, FrequencyAxis Axis, IReadOnlyList<Dof> Dofs, IReadOnlyList<Complex[]> Spectra)
{
    public SourceSpan? Origin { get; init; }
}
