using System.Text.Json;
using Boltup.Engine.Acoustics;
using Boltup.Engine.Comparing;
using Boltup.Reports.Results;

namespace Boltup.Reports.Comparing;

/// <summary>The comparison for programs.</summary>
public static class ComparisonJson
{
    /// <summary>Name and version of the shape.</summary>
    public const string Format = "comparison/1";

    public static void Write(Stream output, ComparisonReport report)
    {
        using var json = new Utf8JsonWriter(output, JsonStyle.Options);
        json.WriteStartObject();
        json.WriteString("boltup", Format);
        json.WriteString("program_version", report.ProgramVersion);
        json.WriteString("base", report.BaseFile);
        json.WriteString("changed", report.ChangedFile);
        json.WriteNumber("tolerance_db", report.ToleranceDb);
        json.WriteString("verdict", Verdict(report));
        WriteDifferences(json, report.Differences);
        WriteEffect(json, report.Effect);
        SharedJson.WriteInputs(json, report.BaseInputs, "base_inputs");
        SharedJson.WriteInputs(json, report.ChangedInputs, "changed_inputs");
        json.WriteEndObject();
    }

    private static string Verdict(ComparisonReport report) => report switch
    {
        { Differences.Count: 0 } => "identical",
        { Effect: null } => "no_effect",
        { IsWorse: true } => "regressed",
        _ => "passed",
    };

    private static void WriteDifferences(Utf8JsonWriter json, IReadOnlyList<InputDifference> differences)
    {
        json.WriteStartArray("differences");
        foreach (InputDifference difference in differences)
        {
            json.WriteStartObject();
            json.WriteString("path", difference.Path);
            json.WriteString("kind", difference.Kind.ToString().ToLowerInvariant());
            json.WriteString("base", difference.Before);
            json.WriteString("changed", difference.After);
            if (difference.Relative is { } relative)
            {
                json.WriteNumber("relative", relative);
            }

            json.WriteBoolean("remark", difference.IsRemark);
            json.WriteEndObject();
        }

        json.WriteEndArray();
    }

    private static void WriteEffect(Utf8JsonWriter json, ComparedPredictions? effect)
    {
        json.WriteStartArray("responses");
        foreach (ResponseChange response in effect?.Responses ?? [])
        {
            WriteResponse(json, response);
        }

        json.WriteEndArray();
        WriteTargets(json, effect?.Targets ?? []);
        WriteTexts(json, "not_compared", effect?.NotCompared ?? []);
        WriteTexts(json, "not_attributed", effect?.NotAttributed ?? []);
    }

    private static void WriteTargets(Utf8JsonWriter json, IReadOnlyList<TargetChange> targets)
    {
        json.WriteStartArray("targets");
        foreach (TargetChange target in targets)
        {
            json.WriteStartObject();
            json.WriteString("target", target.Changed.Target.Name);
            json.WriteString("operation", target.Changed.Operation);
            json.WriteFinite("base_margin_db", target.Base.MarginDb);
            json.WriteFinite("changed_margin_db", target.Changed.MarginDb);
            json.WriteBoolean("lost", target.IsLost);
            json.WriteBoolean("gained", target.IsGained);
            json.WriteEndObject();
        }

        json.WriteEndArray();
    }

    private static void WriteResponse(Utf8JsonWriter json, ResponseChange response)
    {
        json.WriteStartObject();
        json.WriteString("operation", response.Operation);
        json.WriteString("response", response.Response);
        json.WriteString("db_reference", ComparisonWords.ReferenceOf(response).Text);
        json.WriteNumber("lines", response.Lines.Count);
        WriteLevel(json, response, response.Overall);
        json.WriteFinite("first_order_db", response.LinearDecibels);
        json.WriteStartArray("third_octaves");
        foreach (BandChange band in response.Bands)
        {
            json.WriteStartObject();
            json.WriteNumber("hz", band.Band.NominalHz);
            WriteLevel(json, response, band.Level);
            json.WriteEndObject();
        }

        json.WriteEndArray();
        json.WriteStartArray("edits");
        foreach (AttributedChange cause in response.Causes)
        {
            json.WriteStartObject();
            json.WriteString("edit", cause.Cause);
            json.WriteFinite("first_order_db", cause.Decibels);
            json.WriteEndObject();
        }

        json.WriteEndArray();
        WritePaths(json, response);
        json.WriteEndObject();
    }

    private static void WritePaths(Utf8JsonWriter json, ResponseChange response)
    {
        json.WriteStartArray("paths");
        foreach (PathChange path in response.Paths)
        {
            json.WriteStartObject();
            json.WriteString("path", path.Path);
            WriteLevel(json, response, path.Level);
            json.WriteEndObject();
        }

        json.WriteEndArray();
    }

    private static void WriteLevel(Utf8JsonWriter json, ResponseChange response, LevelChange level)
    {
        LevelReference reference = ComparisonWords.ReferenceOf(response);
        json.WriteFinite("base_db", reference.Decibels(Math.Sqrt(level.BasePower)));
        json.WriteFinite("changed_db", reference.Decibels(Math.Sqrt(level.ChangedPower)));
        json.WriteFinite("change_db", level.Decibels);
    }

    private static void WriteTexts(Utf8JsonWriter json, string name, IReadOnlyList<string> texts)
    {
        json.WriteStartArray(name);
        foreach (string text in texts)
        {
            json.WriteStringValue(text);
        }

        json.WriteEndArray();
    }
}
