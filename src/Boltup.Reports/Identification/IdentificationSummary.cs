using System.Text.Json;
using Boltup.Engine.Acoustics;
using Boltup.Engine.Evidence;
using Boltup.Engine.Identification;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;
using Boltup.Engine.VirtualPoints;
using Boltup.Reports.Diagnostics;
using Boltup.Reports.Results;

namespace Boltup.Reports.Identification;

/// <summary>Writes <c>summary.json</c> of an identification.</summary>
internal static class IdentificationSummary
{
    /// <summary>Name and version of the shape.</summary>
    public const string Format = "identification/1";

    private const int WorstBands = 5;

    public static void Write(Stream output, IdentificationReport report)
    {
        using var json = new Utf8JsonWriter(output, JsonStyle.Options);
        IdentificationResult result = report.Result;
        json.WriteStartObject();
        json.WriteString("boltup", Format);
        json.WriteString("title", result.Title);
        json.WriteString("program_version", report.ProgramVersion);
        json.WriteString("kernels", result.Kernels);
        json.WriteString("method", report.Method);
        WriteSizes(json, result);
        WriteHolds(json, report.Holds);
        WriteOperations(json, report);
        WriteChannels(json, result.Quality.Channels);
        WriteVirtualPoints(json, result.Quality.VirtualPoints);
        WriteValidations(json, report.Evidence);
        WriteStiffness(json, report.Evidence.Stiffness);
        WriteRoutes(json, report.Evidence);
        DiagnosticJson.WriteList(json, result.Diagnostics);
        SharedJson.WriteInputs(json, report.Inputs);
        json.WriteString("cautions", Cautions.Text);
        json.WriteEndObject();
    }

    private static void WriteSizes(Utf8JsonWriter json, IdentificationResult result)
    {
        SharedJson.WriteAxis(json, result.Axis);
        json.WriteNumber("forces", result.Interface.Count);
        json.WriteNumber("indicators", result.Indicators.Count);
        json.WriteNumber("validation_sensors", result.Validation.Count);
        json.WriteFinite("median_condition_number", result.SingularValues.MedianCondition());
    }

    private static void WriteHolds(Utf8JsonWriter json, ForceBand holds)
    {
        json.WriteStartObject("holds");
        json.WriteNumber("from_hz", holds.FromHz);
        json.WriteNumber("to_hz", holds.ToHz);
        json.WriteString("because", holds.Because);
        json.WriteEndObject();
    }

    private static void WriteOperations(Utf8JsonWriter json, IdentificationReport report)
    {
        json.WriteStartArray("operations");
        foreach (IdentifiedOperation operation in report.Result.Operations)
        {
            json.WriteStartObject();
            json.WriteString("name", operation.Name);
            json.WriteString("phase", operation.Phase == PhaseReference.Common ? "common" : "free");
            json.WriteString("amplitude", operation.Amplitude == Amplitude.Peak ? "peak" : "rms");
            json.WriteString("unit", operation.Phase == PhaseReference.Common ? "N, N·m" : operation.IsDensity ? "N²/Hz and products" : "N² and products");
            json.WriteString("file", IdentificationFiles.Forces(operation.Name));
            if (operation.Phase == PhaseReference.Free)
            {
                json.WriteNumber("largest_rank", SpectralRank.Of(operation.Forces).Max());
            }

            json.WriteEndObject();
        }

        json.WriteEndArray();
    }

    private static void WriteChannels(Utf8JsonWriter json, ChannelReport? channels)
    {
        if (channels is null)
        {
            return;
        }

        json.WriteStartObject("indicator_channels");
        json.WriteFinite("misfit", channels.Misfit);
        json.WriteFinite("misfit_with_suspects_corrected", channels.CorrectedMisfit);
        json.WriteStartArray("suspects");
        foreach (ChannelSuspect suspect in channels.Suspects)
        {
            json.WriteStringValue(suspect.Describe());
        }

        json.WriteEndArray();
        json.WriteEndObject();
    }

    private static void WriteValidations(Utf8JsonWriter json, BenchEvidence evidence)
    {
        json.WriteStartArray("validations");
        foreach (OperationValidation validation in evidence.Validations)
        {
            json.WriteStartObject();
            json.WriteString("operation", validation.Operation);
            json.WriteString("check", validation.Report.Check == ValidationCheck.OnBoard ? "on board" : "transfer");
            json.WriteString("statement", validation.Report.Statement);
            json.WriteFinite("level_difference_db", validation.Report.OverallLevelDifferenceDb);
            json.WriteFinite("relative_error", validation.Report.RelativeError);
            json.WriteFinite("mean_consistency", validation.Report.MeanConsistency);
            WriteBands(json, validation.Report);
            json.WriteEndObject();
        }

        json.WriteEndArray();
    }

    private static void WriteBands(Utf8JsonWriter json, ValidationReport report)
    {
        json.WriteStartArray("worst_third_octaves");
        foreach ((OctaveBand band, double difference) in ValidationBands.Worst(report, WorstBands))
        {
            json.WriteStartObject();
            json.WriteNumber("band_hz", band.NominalHz);
            json.WriteFinite("difference_db", difference);
            json.WriteEndObject();
        }

        json.WriteEndArray();
    }

    private static void WriteStiffness(Utf8JsonWriter json, BenchStiffness? stiffness)
    {
        if (stiffness is null)
        {
            return;
        }

        json.WriteStartObject("bench_stiffness");
        json.WriteFinite("relative_difference_of_contact_and_blocked", stiffness.TotalDifference);
        json.WriteStartArray("all_forces_agree");
        foreach (AgreementLimit limit in stiffness.Agreement)
        {
            json.WriteStartObject();
            json.WriteNumber("within_db", limit.LimitDb);
            json.WriteFinite("up_to_hz", limit.UpToHz ?? double.NaN);
            json.WriteEndObject();
        }

        json.WriteEndArray();
        json.WriteStartArray("strong_coupling");
        foreach (BenchStiffnessDof dof in stiffness.Dofs.Where(dof => dof.StrongCoupling.Count > 0))
        {
            json.WriteStartObject();
            json.WriteString("dof", dof.Dof.ToString());
            json.WriteString("bands", string.Join(", ", dof.StrongCoupling));
            json.WriteEndObject();
        }

        json.WriteEndArray();
        json.WriteEndObject();
    }

    private static void WriteVirtualPoints(Utf8JsonWriter json, IReadOnlyList<VirtualPointQuality> qualities)
    {
        json.WriteStartArray("virtual_points");
        foreach (VirtualPointQuality quality in qualities)
        {
            json.WriteStartObject();
            json.WriteString("point", quality.Point);
            json.WriteString("channels", quality.OfImpacts ? "impacts" : "sensors");
            json.WriteFinite("consistency", quality.Overall);
            json.WriteFinite("condition_number", quality.Condition);
            json.WriteBoolean("proves_nothing", quality.IsExactlyDetermined);
            json.WriteStartObject("per_channel");
            foreach ((Dof dof, double consistency) in quality.Channels)
            {
                json.WriteFinite(dof.ToString(), consistency);
            }

            json.WriteEndObject();
            json.WriteEndObject();
        }

        json.WriteEndArray();
    }

    private static void WriteRoutes(Utf8JsonWriter json, BenchEvidence evidence)
    {
        json.WriteStartArray("routes");
        foreach (RouteResult route in evidence.Routes)
        {
            json.WriteStartObject();
            json.WriteString("name", route.Name);
            json.WriteString("operation", route.Operation);
            json.WriteString("finds", route.Forces.Nature == ForceNature.Blocked ? "blocked forces" : "contact forces of this bench");
            json.WriteString("file", IdentificationFiles.Route(route.Name, route.Operation));
            json.WriteFinite("relative_difference_from_in_situ", route.Comparison?.TotalDifference ?? double.NaN);
            json.WriteEndObject();
        }

        json.WriteEndArray();
    }
}
