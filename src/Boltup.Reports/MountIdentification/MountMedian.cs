using System.Numerics;
using Boltup.Engine.Prediction;

namespace Boltup.Reports.MountIdentification;

/// <summary>The middle of a stiffness over its lines, which a few bad lines do not move.</summary>
/// <param name="Magnitude">Median of |k|, N/m or N·m/rad.</param>
/// <param name="LossFactor">Median of Im k / Re k.</param>
public readonly record struct MountMedian(double Magnitude, double LossFactor)
{
    public static MountMedian Of(MountTerm term) => new(
        Middle(term.Values.Select(Complex.Abs)), Middle(term.Values.Select(k => k.Imaginary / k.Real)));

    private static double Middle(IEnumerable<double> values)
    {
        double[] sorted = [.. values.Order()];
        return (sorted[(sorted.Length - 1) / 2] + sorted[sorted.Length / 2]) / 2;
    }
}
