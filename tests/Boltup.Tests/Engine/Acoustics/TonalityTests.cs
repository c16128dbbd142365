using Boltup.Engine.Acoustics;
using Boltup.Engine.Spectra;

namespace Boltup.Tests.Engine.Acoustics;

public class TonalityTests
{
    private const double Density = 1e-6;

    /// <summary>Critical band at 1 kHz: 162.2 Hz wide, 922.2 to 1084.4 Hz (ECMA-418-1).</summary>
    [Fact]
    public void Around_OneKilohertz_IsTheStandardsBand()
    {
        CriticalBand band = CriticalBand.Around(1000);
        Assert.Equal(162.2, band.WidthHz, 0.05);
        Assert.Equal(922.2, band.LowerHz, 0.05);
        Assert.Equal(1084.4, band.UpperHz, 0.05);
    }

    [Theory]
    [InlineData(150)]
    [InlineData(400)]
    [InlineData(1000)]
    [InlineData(5000)]
    public void BelowAndAbove_JoinWithoutAGap(double hz)
    {
        CriticalBand band = CriticalBand.Around(hz);
        CriticalBand below = band.Below(20), above = band.Above();
        Assert.Equal(band.LowerHz, below.UpperHz);
        Assert.Equal(band.UpperHz, above.LowerHz);
        CriticalBand again = CriticalBand.Around(above.LowerHz + above.WidthHz / 2);
        Assert.Equal(again.WidthHz, above.WidthHz, 0.02 * above.WidthHz);
        Assert.True(below.LowerHz >= 20 && below.LowerHz < below.UpperHz);
    }

    /// <summary>One line in white noise: both ratios follow from the widths of the bands.</summary>
    [Theory]
    [InlineData(300)]
    [InlineData(1000)]
    [InlineData(4000)]
    public void Of_ToneInWhiteNoise_HasTheAnalyticRatios(int hz)
    {
        CriticalBand band = CriticalBand.Around(hz);
        double noise = Density * band.WidthHz, tone = 20 * noise;
        Tone found = Assert.Single(Tonality.Of(Noise((hz, tone))));
        Assert.Equal(hz, found.Hz);
        Assert.Equal(10 * Math.Log10((tone + Density) / noise), found.ToneToNoise, 1e-9);
        double beside = Density * (band.Below(20).WidthHz + band.Above().WidthHz) / 2;
        Assert.Equal(10 * Math.Log10((tone + noise) / beside), found.ProminenceRatio, 1e-9);
    }

    [Fact]
    public void Of_NoiseAlone_HasNoTone() => Assert.Empty(Tonality.Of(Noise()));

    [Fact]
    public void Of_TwoTonesInOneBand_AreNotNoiseToEachOther()
    {
        double noise = Density * CriticalBand.Around(1000).WidthHz;
        IReadOnlyList<Tone> tones = Tonality.Of(Noise((980, 10 * noise), (1030, 10 * noise)));
        Assert.Equal([980, 1030], tones.Select(tone => tone.Hz));
        Assert.All(tones, tone => Assert.Equal(10, tone.ToneToNoise, 0.1));
    }

    [Fact]
    public void Of_LinesThatEndBeside_HasNoProminenceRatio()
    {
        var axis = FrequencyAxis.Even(900, 1, 200);
        double[] power = [.. Enumerable.Repeat(1.0, 200)];
        power[100] = 1e4;
        Tone tone = Assert.Single(Tonality.Of(new PowerSpectrum(axis, power)));
        Assert.True(double.IsNaN(tone.ProminenceRatio));
        Assert.True(double.IsFinite(tone.ToneToNoise));
    }

    /// <summary>Limits of prominence (ECMA-418-1): 9 and 8 dB from 1 kHz on, more below.</summary>
    [Fact]
    public void Limits_AboveAndBelowOneKilohertz_AreTheStandards()
    {
        Assert.Equal((9, 8), (new Tone(2000, 0, 0).ProminenceLimit, new Tone(2000, 0, 0).ToneToNoiseLimit));
        Assert.Equal(19, new Tone(100, 0, 0).ProminenceLimit, 1e-12);
        Assert.Equal(16.33, new Tone(100, 0, 0).ToneToNoiseLimit, 1e-12);
    }

    private static PowerSpectrum Noise(params (int Hz, double Power)[] tones)
    {
        FrequencyAxis axis = FrequencyAxis.Even(20, 1, 7981);
        double[] power = [.. Enumerable.Repeat(Density, axis.Count)];
        foreach ((int hz, double tone) in tones)
        {
            power[axis.IndexOf(hz)] += tone;
        }

        return new PowerSpectrum(axis, power);
    }
}
