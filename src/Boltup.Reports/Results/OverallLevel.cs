using System.Globalization;
using System.Numerics;
using Boltup.Engine.Acoustics;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;

namespace Boltup.Reports.Results;

/// <summary>The level of a spectrum as a whole, and its strongest line.</summary>
/// <param name="Rms">Root of the summed powers of all lines, in the unit of the spectrum; NaN when a line has no value.</param>
/// <param name="PeakHz">Frequency of the strongest line.</param>
/// <param name="PeakRms">Its rms value.</param>
/// <param name="Reference">What 0 dB is.</param>
public sealed record OverallLevel(double Rms, double PeakHz, double PeakRms, LevelReference Reference)
{
    /// <summary>Overall level in dB re <see cref="Reference"/>; −∞ for silence.</summary>
    public double Decibels => Reference.Decibels(Rms);

    /// <summary>Level of the strongest line in dB.</summary>
    public double PeakDecibels => Reference.Decibels(PeakRms);

    /// <summary>The overall level in words: <c>69.1 dB</c>, or what there is to say when it is no number.</summary>
    public string Text => Decibels switch
    {
        double.NegativeInfinity => "silent",
        double.NaN => "not known",
        _ => string.Create(CultureInfo.InvariantCulture, $"{Decibels:F1} dB"),
    };

    /// <summary>The level of a response, whose lines are rms or peak values.</summary>
    public static OverallLevel Of(ResponseSpectrum response, FrequencyAxis axis, Amplitude amplitude)
    {
        double toRms = amplitude == Amplitude.Peak ? Math.Sqrt(0.5) : 1;
        double power = 0;
        int peak = 0;
        for (int line = 0; line < axis.Count; line++)
        {
            double size = Complex.Abs(response.Values[line]);
            power += size * size;
            peak = size > Complex.Abs(response.Values[peak]) || double.IsNaN(Complex.Abs(response.Values[peak])) ? line : peak;
        }

        return new OverallLevel(
            toRms * Math.Sqrt(power), axis[peak], toRms * Complex.Abs(response.Values[peak]), LevelReference.For(response.Quantity, response.Unit));
    }
}
