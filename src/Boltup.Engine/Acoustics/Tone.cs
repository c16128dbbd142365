namespace Boltup.Engine.Acoustics;

/// <summary>A discrete tone in a spectrum and how much it stands out (ECMA-418-1).</summary>
/// <param name="ProminenceRatio">Its critical band over the mean of the two adjacent ones in dB; NaN where the lines do not reach over them.</param>
/// <param name="ToneToNoise">The tone over the rest of its critical band in dB; NaN where nothing but tones is in it.</param>
public sealed record Tone(double Hz, double ProminenceRatio, double ToneToNoise)
{
    private const double KneeHz = 1000;

    /// <summary>Prominence ratio in dB from which a tone is prominent.</summary>
    public double ProminenceLimit => 9 + (Hz < KneeHz ? 10 * Math.Log10(KneeHz / Hz) : 0);

    /// <summary>Tone-to-noise ratio in dB from which a tone is prominent.</summary>
    public double ToneToNoiseLimit => 8 + (Hz < KneeHz ? 8.33 * Math.Log10(KneeHz / Hz) : 0);
}
