using System.Numerics;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Identification;
using Boltup.Engine.Spectra;
using MathNet.Numerics.LinearAlgebra;
using ComplexVector = MathNet.Numerics.LinearAlgebra.Vector<System.Numerics.Complex>;

namespace Boltup.Tests.Engine.Identification;

/// <summary>The choice of λ against an independent evaluation of its own criterion, dense in λ, with MathNet's matrices.</summary>
public class RegularisationTests
{
    private const int Line = 3;

    private readonly RandomBench _bench = new(sensors: 12, forces: 5, lines: 8);
    private readonly SpectrumSet _measured;

    public RegularisationTests()
    {
        // One force is seen a thousand times less than the others, and the noise hides it.
        var random = new Random(7);
        foreach (Dof sensor in _bench.Sensors)
        {
            _bench[sensor, _bench.Interface[4]] = [.. _bench[sensor, _bench.Interface[4]].Select(value => 1e-3 * value)];
        }

        SpectrumSet exact = _bench.Measure(_bench.RandomForces(2));
        _measured = exact with
        {
            Values = [.. exact.Values.Select(values => values.Zip(RandomBench.Spectrum(random, 8), (value, noise) => value + 0.02 * noise).ToArray())],
        };
    }

    private Matrix<Complex> Frf => Matrix<Complex>.Build.Dense(12, 5, (i, j) => _bench[_bench.Sensors[i], _bench.Interface[j]][Line]);

    private ComplexVector Response => ComplexVector.Build.Dense(12, i => _measured.Values[i][Line]);

    [Fact]
    public void CrossValidation_NoisyData_TakesTheLeastOfItsCriterion()
    {
        double chosen = Identify(DampingRule.CrossValidation).Damping * LargestValue();
        double best = Candidates().Min(Criterion);
        Assert.True(Criterion(chosen) <= 1.0001 * best, $"{Criterion(chosen)} at the choice, {best} at best");
    }

    [Fact]
    public void LCurve_NoisyData_TakesTheLargestCurvature()
    {
        double chosen = Identify(DampingRule.LCurve).Damping * LargestValue();
        // Below 1e-4 the curve hardly moves from point to point, and rounding bends it.
        double[] candidates = [.. Candidates().Where(lambda => lambda > 1e-4 * LargestValue())];
        (double X, double Y)[] points = [.. candidates.Select(Point)];
        int corner = Enumerable.Range(20, points.Length - 40).MaxBy(i => Curvature(points[i - 20], points[i], points[i + 20]));
        Assert.Equal(Math.Log10(candidates[corner]), Math.Log10(chosen), 0.25);
    }

    /// <summary>Regularised forces are nearer to the truth than plain ones where noise fills a weak direction: that is what it is for.</summary>
    [Theory]
    [InlineData(DampingRule.CrossValidation)]
    [InlineData(DampingRule.LCurve)]
    public void Tikhonov_WeakDirectionUnderNoise_ShrinksTheForces(DampingRule rule)
    {
        double plain = Norm(new SolveChoice(SolveMethod.LeastSquares));
        Assert.True(Norm(new SolveChoice(SolveMethod.Tikhonov, Rule: rule)) < 0.8 * plain);
    }

    [Fact]
    public void Truncated_Threshold_LeavesTheWeakDirectionOut()
    {
        IdentificationResult result = Run(new SolveChoice(SolveMethod.Truncated, Threshold: 0.01));
        Assert.All(result.Operations[0].Lines, line => Assert.Equal(4, line.Kept));
    }

    private LineChoice Identify(DampingRule rule) => Run(new SolveChoice(SolveMethod.Tikhonov, Rule: rule)).Operations[0].Lines[Line];

    private double Norm(SolveChoice choice) => Run(choice).Operations[0].Forces[0].Values.Sum(values => values.Sum(value => value.Magnitude));

    private IdentificationResult Run(SolveChoice choice) =>
        Identifier.Run(_bench.Model(12, choice, RandomBench.Operation("run", _measured)), new DiagnosticBag())!;

    private double LargestValue() => Frf.L2Norm();

    private IEnumerable<double> Candidates() => Enumerable.Range(0, 1601).Select(i => LargestValue() * Math.Pow(10, -8 + i / 200.0));

    private Matrix<Complex> Inverse(double lambda) =>
        (Frf.ConjugateTranspose() * Frf + lambda * lambda * Matrix<Complex>.Build.DenseIdentity(5)).Inverse() * Frf.ConjugateTranspose();

    private double Criterion(double lambda)
    {
        Matrix<Complex> hat = Frf * Inverse(lambda);
        double residual = (hat * Response - Response).L2Norm(), trace = (Matrix<Complex>.Build.DenseIdentity(12) - hat).Trace().Real;
        return residual * residual / (trace * trace);
    }

    private (double X, double Y) Point(double lambda)
    {
        ComplexVector forces = Inverse(lambda) * Response;
        return (Math.Log10((Frf * forces - Response).L2Norm()), Math.Log10(forces.L2Norm()));
    }

    private static double Curvature((double X, double Y) a, (double X, double Y) b, (double X, double Y) c)
    {
        double ab = Math.Sqrt(Math.Pow(a.X - b.X, 2) + Math.Pow(a.Y - b.Y, 2)), bc = Math.Sqrt(Math.Pow(b.X - c.X, 2) + Math.Pow(b.Y - c.Y, 2)), ac = Math.Sqrt(Math.Pow(a.X - c.X, 2) + Math.Pow(a.Y - c.Y, 2));
        return ab * bc * ac < 1e-30 ? 0 : 2 * ((b.X - a.X) * (c.Y - a.Y) - (b.Y - a.Y) * (c.X - a.X)) / (ab * bc * ac);
    }
}
