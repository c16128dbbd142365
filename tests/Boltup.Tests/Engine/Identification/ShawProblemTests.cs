using System.Numerics;
using Boltup.Engine;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Identification;
using Boltup.Engine.Spectra;

namespace Boltup.Tests.Engine.Identification;

/// <summary>
/// The image restoration problem of Shaw (J. Math. Anal. Appl. 37 (1972) 83), a severely ill-posed integral equation on [−π/2, π/2] with the
/// kernel (cos s + cos t)²·(sin u/u)², u = π(sin s + sin t), and two humps as solution (from memory). Published behaviour (Hansen, SIAM Review 34
/// (1992) 561; from memory): plain inversion is impossible, while cross-validation and the L-curve come near the best Tikhonov solution.
/// </summary>
public class ShawProblemTests
{
    private const int Unknowns = 20;
    private const int Equations = 40;
    private const double Noise = 1e-3;

    private readonly RandomBench _bench = new(Equations, Unknowns, lines: 8);
    private readonly SpectrumSet _measured;

    public ShawProblemTests()
    {
        double step = Math.PI / Unknowns;
        for (int i = 0; i < Equations * Unknowns; i++)
        {
            (int row, int column) = Math.DivRem(i, Unknowns);
            double s = -Math.PI / 2 + (row + 0.5) * Math.PI / Equations, t = -Math.PI / 2 + (column + 0.5) * step;
            Complex[] spectrum = new Complex[8];
            Array.Fill(spectrum, step * Kernel(s, t));
            _bench[_bench.Sensors[row], _bench.Interface[column]] = spectrum;
        }

        // Each line has noise of its own: eight realisations in one tile.
        SpectrumSet exact = _bench.Measure(Truth());
        var random = new Random(3);
        _measured = exact with
        {
            Values = [.. exact.Values.Select(values => values.Zip(RandomBench.Spectrum(random, 8), (value, noise) => value + Noise * noise).ToArray())],
        };
    }

    [Fact]
    public void Run_LeastSquares_IsRefused()
    {
        var diagnostics = new DiagnosticBag();
        Assert.Null(Identifier.Run(_bench.Model(Equations, SolveChoice.Plain, RandomBench.Operation("run", _measured)), diagnostics));
        Assert.Equal(EngineCodes.IndicatorRankLost, Assert.Single(diagnostics.Items).Code);
    }

    [Theory]
    [InlineData(DampingRule.CrossValidation, 3, 6)]
    [InlineData(DampingRule.LCurve, 6, 8)]
    public void Run_ChosenDamping_ComesNearTheBest(DampingRule rule, double factor, int leastOfEight)
    {
        double[] best = [.. Enumerable.Repeat(double.PositiveInfinity, 8)];
        for (int i = 0; i <= 60; i++)
        {
            double[] errors = Errors(new SolveChoice(SolveMethod.Tikhonov, Damping: Math.Pow(10, -6 + i / 10.0)));
            best = [.. best.Zip(errors, Math.Min)];
        }

        double[] chosen = Errors(new SolveChoice(SolveMethod.Tikhonov, Rule: rule));

        // Cross-validation has a flat minimum and undersmooths now and then, as published; the L-curve does not.
        Assert.InRange(best.Zip(chosen).Count(pair => pair.Second < factor * pair.First), leastOfEight, 8);
    }

    private static double Kernel(double s, double t)
    {
        double u = Math.PI * (Math.Sin(s) + Math.Sin(t));
        double ratio = Math.Abs(u) < 1e-9 ? 1 : Math.Sin(u) / u;
        return Math.Pow((Math.Cos(s) + Math.Cos(t)) * ratio, 2);
    }

    private static double Humps(double t) => 2 * Math.Exp(-6 * Math.Pow(t - 0.8, 2)) + Math.Exp(-2 * Math.Pow(t + 0.5, 2));

    private SpectrumSet Truth() => new(_bench.Axis, _bench.Interface, [.. Enumerable.Range(0, Unknowns).Select(i =>
        Enumerable.Repeat((Complex)Humps(-Math.PI / 2 + (i + 0.5) * Math.PI / Unknowns), 8).ToArray())]);

    /// <summary>Relative error of the solution at each line.</summary>
    private double[] Errors(SolveChoice choice)
    {
        IdentificationResult result = Identifier.Run(_bench.Model(Equations, choice, RandomBench.Operation("run", _measured)), new DiagnosticBag())!;
        SpectrumSet truth = Truth(), found = result.Operations[0].Forces[0];
        return [.. Enumerable.Range(0, 8).Select(line => Math.Sqrt(
            Enumerable.Range(0, Unknowns).Sum(i => Square(found.Values[i][line] - truth.Values[i][line]))
            / Enumerable.Range(0, Unknowns).Sum(i => Square(truth.Values[i][line]))))];
    }

    private static double Square(Complex value) => value.Real * value.Real + value.Imaginary * value.Imaginary;
}
