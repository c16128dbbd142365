using Boltup.Engine.Acoustics;

namespace Boltup.Tests.Engine.Acoustics;

public class SoundWeightingTests
{
    /// <summary>Table 3 of IEC 61672-1:2013, whose values hold at exact band centres 10^(n/10) and are rounded to a tenth.</summary>
    [Theory]
    [InlineData(13, -50.5, -6.2)]
    [InlineData(15, -39.4, -3.0)]
    [InlineData(17, -30.2, -1.3)]
    [InlineData(18, -26.2, -0.8)]
    [InlineData(20, -19.1, -0.3)]
    [InlineData(21, -16.1, -0.2)]
    [InlineData(23, -10.9, 0)]
    [InlineData(24, -8.6, 0)]
    [InlineData(27, -3.2, 0)]
    [InlineData(29, -0.8, 0)]
    [InlineData(30, 0, 0)]
    [InlineData(33, 1.2, -0.2)]
    [InlineData(36, 1.0, -0.8)]
    [InlineData(39, -1.1, -3.0)]
    [InlineData(40, -2.5, -4.4)]
    [InlineData(42, -6.6, -8.5)]
    public void Decibels_BandCentres_AreThoseOfTheStandard(int tenths, double a, double c)
    {
        double hz = Math.Pow(10, tenths / 10.0);
        Assert.Equal(a, SoundWeighting.Decibels(FrequencyWeighting.A, hz), 0.0501);
        Assert.Equal(c, SoundWeighting.Decibels(FrequencyWeighting.C, hz), 0.0501);
        Assert.Equal(0, SoundWeighting.Decibels(FrequencyWeighting.Z, hz));
    }

    /// <summary>1 Pa rms is 93.98 dB re 20 µPa (ISO 1683; arithmetic).</summary>
    [Fact]
    public void Decibels_OnePascalAtOneKilohertz_Is94AndUnweighted()
    {
        LevelReference reference = LevelReference.For(Boltup.Engine.Spectra.Quantity.Pressure, "Pa");
        Assert.Equal(93.9794, reference.Decibels(1), 1e-4);
        Assert.Equal(1, SoundWeighting.PowerFactor(FrequencyWeighting.A, 1000), 1e-4);
        Assert.Equal(0, SoundWeighting.PowerFactor(FrequencyWeighting.A, 0));
    }
}
