using Boltup.Engine.Acoustics;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;

namespace Boltup.Reports.Results;

/// <summary>Writes <c>tones.csv</c>: the discrete tones of every sound pressure and how much they stand out (ECMA-418-1).</summary>
public static class ToneTable
{
    /// <summary>A ratio that cannot be rated is left empty, and so is what follows from it.</summary>
    public static void Write(Stream output, PredictionResult result)
    {
        var csv = new CsvBytes(output);
        csv.Text("operation,response,frequency_hz,prominence_ratio_db,prominence_limit_db,tone_to_noise_db,tone_to_noise_limit_db,prominent_by\n"u8);
        foreach (OperationResult operation in result.Operations)
        {
            foreach (ResponseSpectrum response in operation.Responses.Where(response => response.Quantity == Quantity.Pressure))
            {
                foreach (Tone tone in Tonality.Of(PowerSpectrum.Of(response.Values, operation.Axis, operation.Amplitude)))
                {
                    csv.Text(CsvBytes.Field(operation.Name)).Comma().Text(CsvBytes.Field(response.Name)).Comma().Number(tone.Hz).Comma();
                    Finite(csv, tone.ProminenceRatio).Comma().Number(tone.ProminenceLimit).Comma();
                    Finite(csv, tone.ToneToNoise).Comma().Number(tone.ToneToNoiseLimit).Comma().Text(ProminentBy(tone)).EndRow();
                }
            }
        }

        csv.Flush();
    }

    private static ReadOnlySpan<byte> ProminentBy(Tone tone) => (tone.ProminenceRatio >= tone.ProminenceLimit, tone.ToneToNoise >= tone.ToneToNoiseLimit) switch
    {
        (true, true) => "both"u8,
        (true, false) => "prominence ratio"u8,
        (false, true) => "tone-to-noise ratio"u8,
        _ => "none"u8,
    };

    private static CsvBytes Finite(CsvBytes csv, double value) => double.IsFinite(value) ? csv.Number(value) : csv;
}
