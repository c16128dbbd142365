using System.Numerics;
using Boltup.Engine.Paths;
using Boltup.Engine.Prediction;
using Boltup.Tests.Support;

namespace Boltup.Tests.Engine.Paths;

public class RequiredReductionTests
{
    private const double Rounding = 1e-9;

    private static readonly Complex Left = new(1, 0.5);
    private static readonly Complex Right = new(0.03, 0.08);
    private static readonly LineWeights All = LineWeights.All(TwoSources.Axis.Count);

    [Fact]
    public void Of_ForceReducedAsSaid_TheLimitIsJustKept()
    {
        double limit = 0.25 * PowerOf(Left, Right);
        PathReduction reduction = Reduce(limit).Forces[0];
        Assert.Equal("left.2.x", reduction.Path.Name);
        double factor = Math.Pow(10, -reduction.Decibels!.Value / 20);
        Assert.Equal(limit, PowerOf(Left * factor, Right), Rounding * limit);
        Assert.True(PowerOf(Left * factor * 1.01, Right) > limit);
    }

    [Fact]
    public void Of_AllForcesChangedAsSaid_TheLimitIsJustKept()
    {
        double limit = 0.3 * PowerOf(Left, Right);
        double factor = Math.Pow(10, Reduce(limit).AllForcesChange / 20);
        Assert.Equal(limit, PowerOf(Left * factor, Right * factor), Rounding * limit);
    }

    [Fact]
    public void Of_WeakPath_CannotMeetTheLimitAlone() => Assert.Null(Reduce(0.25 * PowerOf(Left, Right)).Forces[1].Decibels);

    [Fact]
    public void Of_LimitKept_NothingNeedsToDrop()
    {
        RequiredReduction reduction = Reduce(2 * PowerOf(Left, Right));
        Assert.All(reduction.Forces.Concat(reduction.Joints), path => Assert.Equal(0, path.Decibels));
        Assert.Equal(10 * Math.Log10(2), reduction.AllForcesChange, Rounding);
    }

    [Fact]
    public void Of_SeveralLimits_TheHardestDecides()
    {
        OperationPaths paths = Predict(Left, Right).Paths!;
        PathSpectra spectra = paths.Of(0, PathView.Forces);
        LineWeights[] halves = [new LineWeights(0, [.. Enumerable.Repeat(1.0, 10)]), new LineWeights(10, [.. Enumerable.Repeat(1.0, 11)])];
        PathLimit[] limits = [.. halves.Select((half, i) => new PathLimit(half, (i == 0 ? 0.8 : 0.5) * spectra.TotalPower(half)))];
        double? together = RequiredReduction.Of(paths, 0, limits).Forces[0].Decibels;
        double?[] each = [.. limits.Select(limit => RequiredReduction.Of(paths, 0, [limit]).Forces[0].Decibels)];
        Assert.Equal(each.Max(), together);
        Assert.Equal(10 * Math.Log10(0.5), RequiredReduction.Of(paths, 0, limits).AllForcesChange, Rounding);
    }

    /// <summary>One force of this rms value in every third octave, spread evenly, by brute force: the limit is just kept.</summary>
    [Fact]
    public void Of_UniformForceLevel_TheLimitIsJustKept()
    {
        double limit = 0.1 * PowerOf(Left, Right);
        OperationPaths paths = Predict(Left, Right).Paths!;
        double level = RequiredReduction.Of(paths, 0, [new PathLimit(All, limit)]).UniformForceLevel;
        double power = 0;
        foreach (PathBand band in PathBand.ThirdOctaves(TwoSources.Axis))
        {
            double perShare = Math.Pow(10, level / 10) / band.Weights.Factors.Sum();
            for (int i = 0; i < band.Weights.Factors.Length; i++)
            {
                power += perShare * band.Weights.Factors[i] * SquaredResponses(band.Weights.First + i);
            }
        }

        Assert.Equal(limit, power, Rounding * limit);
    }

    private static double SquaredResponses(int line) =>
        Square(Predict(1, 0).Responses[0].Values[line]) + Square(Predict(0, 1).Responses[0].Values[line]);

    private static double Square(Complex value) => value.Real * value.Real + value.Imaginary * value.Imaginary;

    private static RequiredReduction Reduce(double limit) => RequiredReduction.Of(Predict(Left, Right).Paths!, 0, [new PathLimit(All, limit)]);

    private static double PowerOf(Complex left, Complex right) => Predict(left, right).Responses[0].Values.Sum(Square);

    private static OperationResult Predict(Complex left, Complex right) => TwoSources.Predict(
        ForceSum.Phase, TwoSources.Force(TwoSources.LeftFoot, left), TwoSources.Force(TwoSources.RightFoot, right));
}
