using Boltup.Engine.Spectra;

namespace Boltup.Engine.Identification;

/// <summary>Singular values of the indicator FRFs at each line.</summary>
/// <param name="Values">Largest first; for each one value per line, as receptance in m/N.</param>
public sealed record SingularSpectrum(FrequencyAxis Axis, IReadOnlyList<double[]> Values)
{
    /// <summary>Largest over smallest at a line.</summary>
    public double Condition(int line) => Values[0][line] / Values[^1][line];

    /// <summary>The median of the condition numbers of all lines.</summary>
    public double MedianCondition()
    {
        double[] sorted = [.. Enumerable.Range(0, Axis.Count).Select(Condition).Order()];
        return sorted[sorted.Length / 2];
    }
}
