using System.Numerics;
using Boltup.Engine.Paths;
using Boltup.Engine.Prediction;
using Boltup.Tests.Support;

namespace Boltup.Tests.Engine.Paths;

public class PathRankingTests
{
    private const double Rounding = 1e-10;

    [Fact]
    public void Of_TwoForces_TheSharesSumToOneAndTheStrongestIsFirst()
    {
        PathRanking ranking = Rank(new Complex(1, 0.5), new Complex(-0.3, 0.8)).Overall;
        Assert.Equal(1, ranking.Paths.Sum(path => path.Share), Rounding);
        Assert.True(ranking.Paths[0].Power >= ranking.Paths[1].Power);
    }

    [Fact]
    public void Of_HalvedForce_TheLevelChangesAsSaid()
    {
        (Complex left, Complex right) = (new Complex(1, 0.5), new Complex(-0.3, 0.8));
        ResponsePaths all = Rank(left, right);
        PathRanking halved = Rank(left / 2, right).Overall;
        double change = 10 * Math.Log10(halved.Power / all.Overall.Power);
        Assert.Equal(change, all.Overall.Paths.Single(path => path.Path.Name == "left.2.x").HalvedChange, Rounding);
    }

    [Fact]
    public void Of_EqualAndOppositeContributions_TheyCancelAndEitherAloneIsStronger()
    {
        ResponsePaths opposed = Rank(1, OppositeOf(1));
        PathPair pair = Assert.Single(opposed.Overall.Cancelling);
        Assert.Equal(["left.2.x", "right.2.x"], new[] { pair.First.Name, pair.Second.Name });
        Assert.InRange(pair.Cancelled, 0.01, 1);
        Assert.All(opposed.Overall.Paths, path => Assert.True(path.Power > opposed.Overall.Power));
    }

    [Fact]
    public void Of_ContributionsInPhase_NothingCancels() => Assert.Empty(Rank(1, 0).Overall.Cancelling);

    [Fact]
    public void Of_Bands_TheirPowersSumToTheOverallPower()
    {
        ResponsePaths paths = Rank(1, new Complex(0, 2));
        Assert.True(paths.Bands.Count > 5);
        Assert.Equal(paths.Overall.Power, paths.Bands.Sum(band => band.Power), Rounding * paths.Overall.Power);
    }

    private static ResponsePaths Rank(Complex left, Complex right) => TwoSources.Predict(
        ForceSum.Phase, TwoSources.Force(TwoSources.LeftFoot, left), TwoSources.Force(TwoSources.RightFoot, right)).RankedPaths[0];

    /// <summary>The force on the right that is in antiphase at the response, at the strongest line of a force on the left.</summary>
    private static Complex OppositeOf(Complex left)
    {
        PathSpectra unit = TwoSources.Predict(
            ForceSum.Phase, TwoSources.Force(TwoSources.LeftFoot, left), TwoSources.Force(TwoSources.RightFoot, 1)).Paths(PathView.Forces);
        Complex[] first = unit.Contribution(0);
        int strongest = first.Index().MaxBy(line => Complex.Abs(line.Item)).Index;
        return -first[strongest] / unit.Contribution(1)[strongest];
    }
}
