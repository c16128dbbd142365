using Boltup.Engine.Acoustics;
using Boltup.Engine.Spectra;

namespace Boltup.Tests.Engine.Acoustics;

public class BandSumsTests
{
    /// <summary>Centres and edges of IEC 61260-1:2014.</summary>
    [Theory]
    [InlineData(125.893, 112.202, 141.254, 125)]
    [InlineData(251.189, 223.872, 281.838, 250)]
    [InlineData(1000, 891.251, 1122.018, 1000)]
    [InlineData(3981.07, 3548.13, 4466.84, 4000)]
    [InlineData(31.6228, 28.1838, 35.4813, 31.5)]
    public void OctaveBand_ThirdOctaves_HaveTheStandardsEdges(double centreHz, double lowerHz, double upperHz, double nominalHz)
    {
        OctaveBand band = OctaveBand.Of(centreHz);
        Assert.Equal(centreHz, band.CentreHz, centreHz * 1e-5);
        Assert.Equal(lowerHz, band.LowerHz, lowerHz * 1e-5);
        Assert.Equal(upperHz, band.UpperHz, upperHz * 1e-5);
        Assert.Equal(nominalHz, band.NominalHz);
    }

    [Fact]
    public void OctaveBand_Octaves_AreNamedByTheirNominalCentres() =>
        Assert.Equal([31.5, 63, 125, 250, 500, 1000, 2000], Enumerable.Range(-5, 7).Select(index => new OctaveBand(1, index).NominalHz));

    /// <summary>White noise of density w gives w times the bandwidth in every band that the lines cover.</summary>
    [Fact]
    public void Sum_WhiteNoise_IsDensityTimesBandwidth()
    {
        FrequencyAxis axis = FrequencyAxis.Even(20, 1, 1981);
        double[] power = [.. Enumerable.Repeat(0.25, axis.Count)];
        var sums = new BandSums(axis);
        for (int i = 0; i < sums.Bands.Count; i++)
        {
            OctaveBand band = sums.Bands[i];
            double width = Math.Min(band.UpperHz, 2000.5) - Math.Max(band.LowerHz, 19.5);
            Assert.Equal(0.25 * width, sums.Sum(i, power), 1e-9 * width);
        }
    }

    [Fact]
    public void Sum_AllBands_KeepsThePower()
    {
        FrequencyAxis axis = FrequencyAxis.FromHertz([20, 21.5, 30, 44, 45, 46, 70, 71]);
        double[] power = [1, 2, 3, 4, 5, 6, 7, 8];
        var sums = new BandSums(axis);
        Assert.Equal(36, Enumerable.Range(0, sums.Bands.Count).Sum(band => sums.Sum(band, power)), 1e-12);
    }

    [Fact]
    public void Sum_OneLine_BelongsToItsBandAlone()
    {
        var sums = new BandSums(FrequencyAxis.FromHertz([1000]));
        Assert.Equal([1000], sums.Bands.Select(band => band.NominalHz));
        Assert.Equal(4, sums.Sum(0, [4.0]), 1e-12);
    }
}
