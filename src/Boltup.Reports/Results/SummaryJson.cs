using System.Globalization;
using System.Text.Json;
using Boltup.Engine.Prediction;
using Boltup.Reports.Diagnostics;

namespace Boltup.Reports.Results;

/// <summary>Writes <c>summary.json</c>: what a program or a reviewer needs to know of a prediction without its spectra.</summary>
public static class SummaryJson
{
    /// <summary>Name and version of the shape.</summary>
    public const string Format = "results/1";

    public static void Write(Stream output, PredictionResult result, IReadOnlyList<InputFingerprint> inputs, string programVersion)
    {
        using var json = new Utf8JsonWriter(output, JsonStyle.Options);
        json.WriteStartObject();
        json.WriteString("boltup", Format);
        json.WriteString("title", result.Title);
        json.WriteString("program_version", programVersion);
        json.WriteString("kernels", result.Kernels);
        SharedJson.WriteAxis(json, result.Axis);
        WriteConditioning(json, result);
        WriteLevels(json, result);
        PathJson.Write(json, result);
        DiagnosticJson.WriteList(json, result.Diagnostics);
        SharedJson.WriteInputs(json, inputs);
        json.WriteString("cautions", Cautions.Text);
        json.WriteEndObject();
    }

    private static void WriteConditioning(Utf8JsonWriter json, PredictionResult result)
    {
        IReadOnlyList<double> perLine = result.Conditioning.PerLine;
        if (perLine.Count == 0)
        {
            return;
        }

        double[] sorted = [.. perLine.Order()];
        int worst = perLine.Index().First(line => line.Item.Equals(sorted[^1])).Index;
        json.WriteStartObject("interface_condition");
        json.WriteFinite("largest", sorted[^1]);
        json.WriteNumber("largest_at_hz", result.Axis[worst]);
        json.WriteFinite("median", sorted[sorted.Length / 2]);
        json.WriteNumber("rotation_length_m", result.Conditioning.RotationLength);
        json.WritePropertyName("per_line");
        json.WriteRawValue(OneLine(perLine));
        json.WriteEndObject();
    }

    /// <summary>Thousands of numbers in one line, null for a singular line; three digits are plenty for a condition number.</summary>
    private static string OneLine(IReadOnlyList<double> values) => $"[{string.Join(", ", values.Select(Short))}]";

    private static string Short(double value) => double.IsFinite(value) ? value.ToString("G3", CultureInfo.InvariantCulture) : "null";

    private static void WriteLevels(Utf8JsonWriter json, PredictionResult result)
    {
        json.WriteStartArray("levels");
        foreach (OperationResult operation in result.Operations)
        {
            foreach (ResponseSpectrum response in operation.Responses)
            {
                WriteLevel(json, operation, response);
            }
        }

        json.WriteEndArray();
    }

    private static void WriteLevel(Utf8JsonWriter json, OperationResult operation, ResponseSpectrum response)
    {
        OverallLevel level = OverallLevel.Of(response, operation.Axis, operation.Amplitude);
        json.WriteStartObject();
        json.WriteString("operation", operation.Name);
        json.WriteString("response", response.Name);
        json.WriteString("dof", response.Dof);
        json.WriteString("unit", response.Unit);
        json.WriteString("amplitude", operation.Amplitude == Amplitude.Peak ? "peak" : "rms");
        json.WriteNumber("from_hz", operation.Axis.FirstHz);
        json.WriteNumber("to_hz", operation.Axis.LastHz);
        json.WriteFinite("overall_rms", level.Rms);
        json.WriteFinite("overall_db", level.Decibels);
        json.WriteString("db_reference", level.Reference.Text);
        json.WriteNumber("strongest_line_hz", level.PeakHz);
        json.WriteFinite("strongest_line_db", level.PeakDecibels);
        json.WriteEndObject();
    }
}
