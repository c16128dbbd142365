using System.Numerics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Evidence;

/// <summary>What the comparison of two sets of spectra needs of one line, or of all: sums over the dofs, weighted by <see cref="KindWeights"/>.</summary>
internal readonly record struct AgreementSums(Complex Cross, double Predicted, double Measured, double Difference)
{
    /// <summary>|Σ p m*|²/(Σ|p|² Σ|m|²), NaN where either is zero.</summary>
    public double Consistency => KindWeights.Square(Cross) / (Predicted * Measured);

    /// <summary>10 lg Σ|p|²/Σ|m|².</summary>
    public double LevelDifferenceDb => Decibel(Predicted, Measured);

    /// <summary>‖p − m‖/‖m‖.</summary>
    public double RelativeError => Math.Sqrt(Difference / Measured);

    /// <summary>The sums of every line.</summary>
    /// <param name="dofs">What responds in each spectrum.</param>
    public static AgreementSums[] PerLine(IReadOnlyList<Dof> dofs, IReadOnlyList<Complex[]> predicted, IReadOnlyList<Complex[]> measured)
    {
        double[] weights = KindWeights.Of(dofs, measured);
        var lines = new AgreementSums[measured[0].Length];
        for (int dof = 0; dof < weights.Length; dof++)
        {
            for (int line = 0; line < lines.Length; line++)
            {
                lines[line] = lines[line].With(predicted[dof][line], measured[dof][line], weights[dof]);
            }
        }

        return lines;
    }

    /// <summary>All lines together; the cross term keeps its phase from line to line.</summary>
    public static AgreementSums Total(AgreementSums[] lines) => new(
        lines.Aggregate(Complex.Zero, (sum, line) => sum + line.Cross),
        lines.Sum(line => line.Predicted),
        lines.Sum(line => line.Measured),
        lines.Sum(line => line.Difference));

    /// <summary>10 lg of a ratio of powers; NaN where either is zero, so that pictures show a gap.</summary>
    public static double Decibel(double predicted, double measured) =>
        predicted > 0 && measured > 0 ? 10 * Math.Log10(predicted / measured) : double.NaN;

    private AgreementSums With(Complex predicted, Complex measured, double weight) => new(
        Cross + weight * predicted * Complex.Conjugate(measured),
        Predicted + weight * KindWeights.Square(predicted),
        Measured + weight * KindWeights.Square(measured),
        Difference + weight * KindWeights.Square(predicted - measured));
}
