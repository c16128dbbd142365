using Boltup.Engine.Acoustics;
using Boltup.Engine.Spectra;

namespace Boltup.Tests.Engine.Acoustics;

public class HumanWeightingTests
{
    /// <summary>Factors of ISO 2631-1 / ISO 8041-1 at 10^(n/10) Hz, four digits.</summary>
    [Theory]
    [InlineData(-1, 0.4767, 0.9914)]
    [InlineData(0, 0.4825, 1.011)]
    [InlineData(3, 0.5308, 0.8913)]
    [InlineData(6, 0.9648, 0.5143)]
    [InlineData(8, 1.054, 0.3226)]
    [InlineData(9, 1.037, 0.255)]
    [InlineData(12, 0.7743, 0.1266)]
    [InlineData(15, 0.4031, 0.06299)]
    [InlineData(18, 0.1857, 0.02946)]
    [InlineData(20, 0.08873, 0.01414)]
    public void PowerFactor_WholeBody_IsThePublishedFactor(int n, double wk, double wd)
    {
        double hz = Math.Pow(10, n / 10.0);
        Assert.Equal(wk, Amplitude(FrequencyWeighting.Wk, hz), 6e-4 * wk);
        Assert.Equal(wd, Amplitude(FrequencyWeighting.Wd, hz), 6e-4 * wd);
    }

    /// <summary>
    /// Factors of ISO 5349-1, table A.2 (from memory), and the same transfer function evaluated by a separate Python script; both
    /// agree to the three digits of the table.
    /// </summary>
    [Theory]
    [InlineData(8, 0.7272)]
    [InlineData(11, 0.9576)]
    [InlineData(15, 0.5192)]
    [InlineData(18, 0.256)]
    [InlineData(21, 0.12696)]
    [InlineData(27, 0.03137)]
    [InlineData(30, 0.01346)]
    public void PowerFactor_HandArm_IsThePublishedFactor(int n, double wh) =>
        Assert.Equal(wh, Amplitude(FrequencyWeighting.Wh, Math.Pow(10, n / 10.0)), 2e-3 * wh);

    [Fact]
    public void PowerFactor_Standstill_IsNothing() => Assert.Equal(0, FrequencyWeighting.Wk.PowerFactor(0));

    [Fact]
    public void Fits_QuantityOfTheStandard_Only()
    {
        Assert.True(FrequencyWeighting.A.Fits(Quantity.Pressure));
        Assert.False(FrequencyWeighting.A.Fits(Quantity.Acceleration));
        Assert.True(FrequencyWeighting.Wk.Fits(Quantity.Acceleration));
        Assert.False(FrequencyWeighting.Wh.Fits(Quantity.Velocity));
        Assert.True(FrequencyWeighting.Z.Fits(Quantity.Velocity));
    }

    /// <summary>Directive 2002/44/EC, article 3.</summary>
    [Fact]
    public void Exposure_Values_AreTheDirectives()
    {
        Assert.Equal((2.5, 5.0), (Exposure.For(FrequencyWeighting.Wh)!.ActionValue, Exposure.For(FrequencyWeighting.Wh)!.LimitValue));
        Assert.Equal((0.5, 1.15), (Exposure.For(FrequencyWeighting.Wk)!.ActionValue, Exposure.For(FrequencyWeighting.Wd)!.LimitValue));
        Assert.Null(Exposure.For(FrequencyWeighting.A));
        Assert.Contains("2002/44/EC", Exposure.WholeBody.Caution, StringComparison.Ordinal);
        Assert.Contains("1.15 m/s²", Exposure.WholeBody.Caution, StringComparison.Ordinal);
    }

    private static double Amplitude(FrequencyWeighting weighting, double hz) => Math.Sqrt(weighting.PowerFactor(hz));
}
