using System.Numerics;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Acoustics;

/// <summary>Mean squares of lines, on which levels and tones are computed.</summary>
/// <param name="Power">One mean square per line, in the unit of the quantity squared; NaN where a line has no value.</param>
public sealed record PowerSpectrum(FrequencyAxis Axis, double[] Power)
{
    /// <summary>Of a line spectrum, whose magnitudes are rms or peak values.</summary>
    public static PowerSpectrum Of(IReadOnlyList<Complex> values, FrequencyAxis axis, Amplitude amplitude)
    {
        double toMeanSquare = amplitude == Amplitude.Peak ? 0.5 : 1;
        var power = new double[axis.Count];
        for (int line = 0; line < power.Length; line++)
        {
            double real = values[line].Real, imaginary = values[line].Imaginary;
            power[line] = toMeanSquare * (real * real + imaginary * imaginary);
        }

        return new PowerSpectrum(axis, power);
    }

    /// <summary>Every line weighted.</summary>
    public double[] Weighted(FrequencyWeighting weighting) => [.. Power.Select((power, line) => power * weighting.PowerFactor(Axis[line]))];
}
