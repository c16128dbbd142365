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

    [Theory]
    [InlineData(ForceSum.Phase)]
    [InlineData(ForceSum.Energy)]
    public void Of_HalvedForce_TheLevelChangesAsSaid(ForceSum sum)
    {
        (Complex left, Complex right) = (new Complex(1, 0.5), new Complex(-0.3, 0.8));
        ResponsePaths all = Rank(left, right, sum);
        PathRanking halved = Rank(left / 2, right, sum).Overall;
        double change = 10 * Math.Log10(halved.Power / all.Overall.Power);
        Assert.Equal(change, all.Overall.Paths.Single(path => path.Path.Name == "left.2.x").HalvedChange, Rounding);
    }

    /// <summary>1 and −0.9 leave 0.1: shares 10 and −9; half of the first leaves −0.4, which is four times as much; 1.8 of 1.81 is cancelled.</summary>
    [Fact]
    public void Of_OpposedContributions_TheyCancel()
    {
        PathRanking ranking = Rank([1], [-0.9]);
        PathPair pair = Assert.Single(ranking.Cancelling);
        Assert.Equal(["0", "1"], new[] { pair.First.Name, pair.Second.Name });
        Assert.Equal(1.8 / 1.81, pair.Cancelled, Rounding);
        Assert.Equal([10, -9], ranking.Paths.Select(path => Math.Round(path.Share, 9)));
        Assert.Equal(20 * Math.Log10(4), ranking.Paths[0].HalvedChange, Rounding);
    }

    [Fact]
    public void Of_ContributionsInPhaseOrQuadrature_NothingCancels()
    {
        Assert.Empty(Rank([1, 2], [0.5, 3]).Cancelling);
        Assert.Empty(Rank([1, 2], [Complex.ImaginaryOne, -2 * Complex.ImaginaryOne]).Cancelling);
    }

    [Fact]
    public void Of_ManyPaths_NamesTheStrongestPairsFirst()
    {
        PathRanking ranking = Rank([4], [-3], [2], [-1]);
        Assert.Equal([("0", "1"), ("1", "2"), ("0", "3"), ("2", "3")], ranking.Cancelling.Select(pair => (pair.First.Name, pair.Second.Name)));
    }

    [Fact]
    public void Of_Bands_TheirPowersSumToTheOverallPower()
    {
        ResponsePaths paths = Rank(1, new Complex(0, 2));
        Assert.True(paths.Bands.Count > 5);
        Assert.Equal(paths.Overall.Power, paths.Bands.Sum(band => band.Power), Rounding * paths.Overall.Power);
    }

    private static ResponsePaths Rank(Complex left, Complex right, ForceSum sum = ForceSum.Phase) => TwoSources.Predict(
        sum, TwoSources.Force(TwoSources.LeftFoot, left), TwoSources.Force(TwoSources.RightFoot, right)).RankedPaths[0];

    /// <summary>Ranks paths named by number, by their contributions at each line.</summary>
    private static PathRanking Rank(params Complex[][] contributions)
    {
        int lines = contributions[0].Length;
        var spectra = new PathSpectra([.. contributions.Select((_, i) => new TransferPath(PathKind.Force, $"{i}"))], 1, lines, 1);
        for (int path = 0; path < contributions.Length; path++)
        {
            for (int line = 0; line < lines; line++)
            {
                spectra.Real(path, 0)[line] = contributions[path][line].Real;
                spectra.Imaginary(path, 0)[line] = contributions[path][line].Imaginary;
            }
        }

        spectra.SumUp();
        return PathRanking.Of(spectra, PathBand.Overall(lines));
    }
}
