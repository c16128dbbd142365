using System.Numerics;
using Boltup.Engine.Acoustics;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;
using Boltup.Reports.Results;

namespace Boltup.Tests.Reports.Results;

public class OverallLevelTests
{
    [Fact]
    public void Of_RmsLines_IsTheRootOfTheSummedPowers()
    {
        var level = OverallLevel.Of(TinyResult.Ear with { Values = [3, 0, new Complex(0, 4)] }, TinyResult.Axis, Amplitude.Rms);

        Assert.Equal(5, level.Rms, 12);
        Assert.Equal(1000, level.PeakHz);
        Assert.Equal(20 * Math.Log10(5 / 20e-6), level.Decibels, 9);
        Assert.Equal(20 * Math.Log10(4 / 20e-6), level.PeakDecibels, 9);
    }

    [Fact]
    public void Of_PeakLines_IsThreeDecibelsLess()
    {
        var rms = OverallLevel.Of(TinyResult.Ear, TinyResult.Axis, Amplitude.Rms);
        var peak = OverallLevel.Of(TinyResult.Ear, TinyResult.Axis, Amplitude.Peak);

        Assert.Equal(10 * Math.Log10(2), rms.Decibels - peak.Decibels, 9);
        Assert.Equal(10 * Math.Log10(2), rms.PeakDecibels - peak.PeakDecibels, 9);
    }

    /// <summary>94 dB: the level of 1 Pa, as every sound calibrator gives it (IEC 60942; from memory).</summary>
    [Fact]
    public void Of_OnePascal_IsNinetyFourDecibels() =>
        Assert.Equal(93.98, OverallLevel.Of(TinyResult.Ear with { Values = [1, 0, 0] }, TinyResult.Axis, Amplitude.Rms).Decibels, 2);

    /// <summary>References of ISO 1683 (from memory): 20 µPa, 1 µm/s², 1 nm/s, 1 pm.</summary>
    [Theory]
    [InlineData(Quantity.Pressure, "Pa", 94.0, "20 µPa")]
    [InlineData(Quantity.Acceleration, "m/s²", 120, "1 µm/s²")]
    [InlineData(Quantity.Acceleration, "rad/s²", 120, "1 µrad/s²")]
    [InlineData(Quantity.Velocity, "m/s", 180, "1 nm/s")]
    [InlineData(Quantity.Displacement, "m", 240, "1 pm")]
    public void For_UnitValue_HasTheStandardLevel(Quantity quantity, string unit, double decibels, string text)
    {
        var reference = LevelReference.For(quantity, unit);

        Assert.Equal(decibels, reference.Decibels(1), 1);
        Assert.Equal(text, reference.Text);
    }

    [Fact]
    public void Of_Silence_IsMinusInfinity() =>
        Assert.Equal(double.NegativeInfinity, OverallLevel.Of(TinyResult.Ear with { Values = [0, 0, 0] }, TinyResult.Axis, Amplitude.Rms).Decibels);

    [Fact]
    public void Of_MissingLine_HasNoOverallLevelButAStrongestLine()
    {
        var level = OverallLevel.Of(TinyResult.Ear with { Values = [double.NaN, 2, 1] }, TinyResult.Axis, Amplitude.Rms);

        Assert.True(double.IsNaN(level.Decibels));
        Assert.Equal(50.5, level.PeakHz);
    }
}
