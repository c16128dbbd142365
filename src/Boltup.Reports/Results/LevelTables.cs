using Boltup.Engine.Acoustics;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;

namespace Boltup.Reports.Results;

/// <summary>Writes <c>levels.csv</c> and <c>bands.csv</c>: levels in dB re the reference of the quantity, weighted where it is sound or its response says how people feel it.</summary>
public static class LevelTables
{
    private static readonly FrequencyWeighting[] OfSound = [FrequencyWeighting.Z, FrequencyWeighting.A, FrequencyWeighting.C];

    /// <summary>Overall levels.</summary>
    public static void WriteLevels(Stream output, PredictionResult result)
    {
        var csv = new CsvBytes(output);
        csv.Text("operation,response,weighting,from_hz,to_hz,level_db,reference\n"u8);
        foreach ((OperationResult operation, ResponseSpectrum response, FrequencyWeighting weighting) in Cases(result))
        {
            double[] power = Powers(response, operation, weighting);
            csv.Text(KeyOf(operation, response, weighting)).Comma()
                .Number(operation.Axis.FirstHz).Comma().Number(operation.Axis.LastHz).Comma();
            Level(csv, power.Sum(), response).Comma().Text(CsvBytes.Field(LevelReference.For(response.Quantity, response.Unit).Text)).EndRow();
        }

        csv.Flush();
    }

    /// <summary>Third-octave levels (IEC 61260-1), with the number of lines that a band rests on: fewer than five say little of a noise.</summary>
    public static void WriteBands(Stream output, PredictionResult result)
    {
        var csv = new CsvBytes(output);
        csv.Text("operation,response,weighting,band_hz,lines,level_db\n"u8);
        foreach ((OperationResult operation, ResponseSpectrum response, FrequencyWeighting weighting) in Cases(result))
        {
            var bands = new BandSums(operation.Axis);
            double[] power = Powers(response, operation, weighting);
            byte[] key = KeyOf(operation, response, weighting);
            for (int band = 0; band < bands.Bands.Count; band++)
            {
                csv.Text(key).Comma().Number(bands.Bands[band].NominalHz).Comma().Number(bands.LinesIn(band)).Comma();
                Level(csv, bands.Sum(band, power), response).EndRow();
            }
        }

        csv.Flush();
    }

    private static IEnumerable<(OperationResult, ResponseSpectrum, FrequencyWeighting)> Cases(PredictionResult result) =>
        from operation in result.Operations
        from response in operation.Responses
        from weighting in WeightingsOf(response)
        select (operation, response, weighting);

    private static FrequencyWeighting[] WeightingsOf(ResponseSpectrum response) =>
        response.Quantity == Quantity.Pressure ? OfSound
        : response.Weighting is { } own ? [FrequencyWeighting.Z, own]
        : [FrequencyWeighting.Z];

    private static byte[] KeyOf(OperationResult operation, ResponseSpectrum response, FrequencyWeighting weighting) =>
        [.. CsvBytes.Field(operation.Name), (byte)',', .. CsvBytes.Field(response.Name), (byte)',', .. CsvBytes.Field(weighting.ToString())];

    private static double[] Powers(ResponseSpectrum response, OperationResult operation, FrequencyWeighting weighting) =>
        PowerSpectrum.Of(response.Values, operation.Axis, operation.Amplitude).Weighted(weighting);

    /// <summary>Empty for silence, which has no level.</summary>
    private static CsvBytes Level(CsvBytes csv, double power, ResponseSpectrum response) => power > 0
        ? csv.Number(LevelReference.For(response.Quantity, response.Unit).Decibels(Math.Sqrt(power)))
        : csv;
}
