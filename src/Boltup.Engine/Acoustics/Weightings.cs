using Boltup.Engine.Spectra;

namespace Boltup.Engine.Acoustics;

/// <summary>What frequency weightings do and to which quantity.</summary>
public static class Weightings
{
    /// <summary>Whether it weighs vibration that acts on people.</summary>
    public static bool IsOfVibration(this FrequencyWeighting weighting) =>
        weighting is FrequencyWeighting.Wk or FrequencyWeighting.Wd or FrequencyWeighting.Wh;

    /// <summary>Whether a spectrum of this quantity may be weighted so: A and C are for sound, Wk, Wd and Wh for acceleration.</summary>
    public static bool Fits(this FrequencyWeighting weighting, Quantity quantity) => weighting == FrequencyWeighting.Z
        || quantity == (weighting.IsOfVibration() ? Quantity.Acceleration : Quantity.Pressure);

    /// <summary>The factor on a power at a frequency.</summary>
    public static double PowerFactor(this FrequencyWeighting weighting, double hz) => weighting switch
    {
        FrequencyWeighting.Wk => Square(HumanWeighting.Wk.AmplitudeAt(hz)),
        FrequencyWeighting.Wd => Square(HumanWeighting.Wd.AmplitudeAt(hz)),
        FrequencyWeighting.Wh => Square(HumanWeighting.Wh.AmplitudeAt(hz)),
        _ => SoundWeighting.PowerFactor(weighting, hz),
    };

    private static double Square(double amplitude) => amplitude * amplitude;
}
