using System.Numerics;

namespace Boltup.Engine.Acoustics;

/// <summary>
/// A weighting of vibration that acts on people as the product of four transfer functions: high pass, low pass, transition from acceleration
/// to velocity, and upward step (ISO 8041-1; parameters of ISO 2631-1 and ISO 5349-1 from memory, factors checked against published ones).
/// </summary>
/// <param name="HighPassHz">f1.</param>
/// <param name="LowPassHz">f2.</param>
/// <param name="TransitionHz">f3 = f4.</param>
/// <param name="TransitionQ">Q4.</param>
/// <param name="Step">f5, Q5, f6, Q6; null for none.</param>
internal sealed record HumanWeighting(
    double HighPassHz, double LowPassHz, double TransitionHz, double TransitionQ, (double LowerHz, double LowerQ, double UpperHz, double UpperQ)? Step)
{
    public static readonly HumanWeighting Wk = new(0.4, 100, 12.5, 0.63, (2.37, 0.91, 3.35, 0.91));

    public static readonly HumanWeighting Wd = new(0.4, 100, 2, 0.63, null);

    public static readonly HumanWeighting Wh = new(Math.Pow(10, 0.8), Math.Pow(10, 3.1), 100 / (2 * Math.PI), 0.64, null);

    /// <summary>Q of the two band limits: Butterworth.</summary>
    private static readonly double BandQ = Math.Sqrt(0.5);

    /// <summary>|H| at a frequency; 0 at 0 Hz.</summary>
    public double AmplitudeAt(double hz)
    {
        if (hz == 0)
        {
            return 0;
        }

        Complex high = 1 / Quadratic(HighPassHz / new Complex(0, hz), BandQ);
        Complex low = 1 / Quadratic(new Complex(0, hz / LowPassHz), BandQ);
        Complex transition = (1 + new Complex(0, hz / TransitionHz)) / Quadratic(new Complex(0, hz / TransitionHz), TransitionQ);
        return Complex.Abs(high * low * transition * StepAt(hz));
    }

    private Complex StepAt(double hz) => Step is not var (lowerHz, lowerQ, upperHz, upperQ)
        ? 1
        : lowerHz * lowerHz / (upperHz * upperHz)
            * Quadratic(new Complex(0, hz / lowerHz), lowerQ) / Quadratic(new Complex(0, hz / upperHz), upperQ);

    /// <summary>1 + s/Q + s².</summary>
    private static Complex Quadratic(Complex s, double q) => 1 + s / q + s * s;
}
