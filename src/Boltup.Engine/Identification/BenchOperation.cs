using Boltup.Engine.Diagnostics;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Identification;

/// <summary>
/// One running condition of the source on the bench: what all sensors measured at the same time. Each column is a spectrum with phase;
/// columns have no phase in common, so that powers add: G = Σ u·uᴴ. One column is a phase-referenced operation.
/// </summary>
/// <param name="Phase">Whether there is one column with one phase reference, or several without.</param>
/// <param name="Columns">Spectra of indicators and validation sensors in one order, as the engine holds motion: displacement in m.</param>
/// <param name="Runs">The single runs, where several were averaged; they give the scatter of the forces.</param>
public sealed record BenchOperation(
    string Name, Amplitude Amplitude, PhaseReference Phase, IReadOnlyList<SpectrumSet> Columns, IReadOnlyList<SpectrumSet>? Runs = null)
{
    public SourceSpan? Origin { get; init; }

    /// <summary>Whether the values are densities per Hz: the columns are then in unit/√Hz.</summary>
    public bool IsDensity { get; init; }
}
