namespace Boltup.Engine.Acoustics;

/// <summary>
/// The A and C weighting of IEC 61672-1:2013, annex E, from their pole frequencies; normalised to 0 dB at 1 kHz by the constants of the standard.
/// </summary>
public static class SoundWeighting
{
    private const double F1 = 20.598997, F2 = 107.65265, F3 = 737.86223, F4 = 12194.217;
    private const double NormA = 2.000, NormC = 0.062;

    /// <summary>The weighting in dB at a frequency; minus infinity at 0 Hz for A and C.</summary>
    public static double Decibels(FrequencyWeighting weighting, double hz)
    {
        double square = hz * hz;
        return weighting switch
        {
            FrequencyWeighting.A => 20 * Math.Log10(F4 * F4 * square * square
                / ((square + F1 * F1) * Math.Sqrt((square + F2 * F2) * (square + F3 * F3)) * (square + F4 * F4))) + NormA,
            FrequencyWeighting.C => 20 * Math.Log10(F4 * F4 * square / ((square + F1 * F1) * (square + F4 * F4))) + NormC,
            _ => 0,
        };
    }

    /// <summary>The factor on a power at a frequency.</summary>
    public static double PowerFactor(FrequencyWeighting weighting, double hz) =>
        weighting == FrequencyWeighting.Z ? 1 : Math.Pow(10, Decibels(weighting, hz) / 10);
}
