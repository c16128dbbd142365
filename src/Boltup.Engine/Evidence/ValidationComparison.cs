using System.Numerics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Evidence;

/// <summary>Compares predicted with measured responses at dofs that took no part in an identification (on-board validation: ISO 20270).</summary>
public static class ValidationComparison
{
    /// <param name="predicted">Responses to the identified forces.</param>
    /// <param name="measured">The same dofs at the same lines, in the same quantities.</param>
    public static ValidationReport Compare(ValidationCheck check, SpectrumSet predicted, SpectrumSet measured)
    {
        SquareFrf.RequireLines(predicted.Axis, measured.Axis);
        if (!predicted.Dofs.SequenceEqual(measured.Dofs))
        {
            throw new ArgumentException($"predicted at {string.Join(", ", predicted.Dofs)}, measured at {string.Join(", ", measured.Dofs)}");
        }

        Sums[] lines = SumUp(predicted, measured, KindWeights.Of(measured.Dofs, measured.Values));
        double error = lines.Sum(line => line.Difference);
        double power = lines.Sum(line => line.Measured);
        return new ValidationReport(
            check,
            measured.Axis,
            [.. measured.Dofs.Select((dof, i) => Compare(dof, predicted.Values[i], measured.Values[i]))],
            [.. lines.Select(line => measured.Dofs.Count > 1 ? line.Consistency : double.NaN)],
            [.. lines.Select(line => Decibel(line.Predicted, line.Measured))],
            Math.Sqrt(error / power),
            Decibel(lines.Sum(line => line.Predicted), power));
    }

    private static ValidationDof Compare(Dof dof, Complex[] predicted, Complex[] measured)
    {
        double power = measured.Sum(KindWeights.Square);
        return new ValidationDof(
            dof,
            predicted,
            measured,
            [.. predicted.Zip(measured, (p, m) => Decibel(KindWeights.Square(p), KindWeights.Square(m)))],
            Math.Sqrt(predicted.Zip(measured, (p, m) => KindWeights.Square(p - m)).Sum() / power),
            Decibel(predicted.Sum(KindWeights.Square), power));
    }

    private static Sums[] SumUp(SpectrumSet predicted, SpectrumSet measured, double[] weights)
    {
        var lines = new Sums[measured.Axis.Count];
        for (int dof = 0; dof < weights.Length; dof++)
        {
            for (int line = 0; line < lines.Length; line++)
            {
                lines[line] = lines[line].With(predicted.Values[dof][line], measured.Values[dof][line], weights[dof]);
            }
        }

        return lines;
    }

    /// <summary>10 lg of a ratio of powers; NaN where either is zero, so that pictures show a gap.</summary>
    private static double Decibel(double predicted, double measured) =>
        predicted > 0 && measured > 0 ? 10 * Math.Log10(predicted / measured) : double.NaN;

    /// <summary>Weighted sums over the dofs of one line.</summary>
    private readonly record struct Sums(Complex Cross, double Predicted, double Measured, double Difference)
    {
        public double Consistency => KindWeights.Square(Cross) / (Predicted * Measured);

        public Sums With(Complex predicted, Complex measured, double weight) => new(
            Cross + weight * predicted * Complex.Conjugate(measured),
            Predicted + weight * KindWeights.Square(predicted),
            Measured + weight * KindWeights.Square(measured),
            Difference + weight * KindWeights.Square(predicted - measured));
    }
}
