using System.Globalization;
using System.Text.Json;
using Boltup.Engine.Paths;
using Boltup.Engine.Prediction;
using Boltup.Engine.Targets;
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
        WriteVerdicts(json, result);
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

    private static void WriteVerdicts(Utf8JsonWriter json, PredictionResult result)
    {
        json.WriteStartArray("targets");
        foreach (TargetVerdict verdict in result.Verdicts)
        {
            json.WriteStartObject();
            json.WriteString("target", verdict.Target.Name);
            json.WriteString("response", verdict.Target.Response);
            json.WriteString("operation", verdict.Operation);
            json.WriteString("weighting", verdict.Target.Weighting.ToString());
            json.WriteFinite("level_db", verdict.LevelDb);
            json.WriteNumber("limit_db", verdict.LimitDb);
            json.WriteString("db_reference", verdict.Reference.Text);
            if (verdict.Band is { } band)
            {
                json.WriteNumber("deciding_third_octave_hz", band.NominalHz);
            }

            json.WriteFinite("margin_db", verdict.MarginDb);
            json.WriteString("verdict", !verdict.IsJudged ? "not judged" : verdict.IsMissed ? "missed" : "met");
            WriteReduction(json, verdict);
            json.WriteEndObject();
        }

        json.WriteEndArray();
    }

    private static void WriteReduction(Utf8JsonWriter json, TargetVerdict verdict)
    {
        if (verdict.Reduction is not { } reduction)
        {
            return;
        }

        json.WriteFinite("all_forces_change_db", reduction.AllForcesChange);
        json.WriteFinite("largest_uniform_force_db_re_1_n", reduction.UniformForceLevel);
        WritePathReductions(json, "reduction_of_one_joint_path_db", reduction.Joints);
        WritePathReductions(json, "reduction_of_one_force_db", reduction.Forces);
    }

    /// <summary>Null where the path alone cannot meet the target.</summary>
    private static void WritePathReductions(Utf8JsonWriter json, string name, IReadOnlyList<PathReduction> reductions)
    {
        json.WriteStartObject(name);
        foreach (PathReduction reduction in reductions)
        {
            json.WriteFinite(reduction.Path.Name, reduction.Decibels ?? double.NaN);
        }

        json.WriteEndObject();
    }

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
