using Boltup.Engine.Spectra;

namespace Boltup.Engine.Evidence;

/// <summary>How much of the measured responses the excitations explain.</summary>
/// <param name="Averages">Number of averages behind every coherence.</param>
/// <param name="Mean">Per line: mean γ² of all FRFs.</param>
/// <param name="Least">Per line: smallest γ² of all FRFs.</param>
/// <param name="LowBands">Bands where the mean is low.</param>
/// <param name="Weakest">The FRFs with the lowest mean over all lines, lowest first, at most ten.</param>
public sealed record CoherenceReport(
    FrequencyAxis Axis,
    int Averages,
    IReadOnlyList<double> Mean,
    IReadOnlyList<double> Least,
    IReadOnlyList<LineBand> LowBands,
    IReadOnlyList<(DofPair Frf, double Mean)> Weakest);
