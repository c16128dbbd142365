using System.Globalization;
using Boltup.Cli.Terminal;
using Boltup.Engine.Evidence;
using Boltup.Engine.Identification;
using Boltup.Reports.Identification;
using Boltup.Reports.Results;

namespace Boltup.Cli.Commands;

/// <summary>What an identification prints: how it was done, what was checked and what came of it, what was written.</summary>
internal static class IdentificationText
{
    public static void Print(Screen screen, IdentificationReport report, string folder, IReadOnlyList<string> files)
    {
        IdentificationResult result = report.Result;
        screen.Out.WriteLine(screen.Ink.Strong(result.Title));
        screen.Out.WriteLine(string.Create(
            CultureInfo.InvariantCulture,
            $"{result.Axis}; {result.Interface.Count} forces from {result.Indicators.Count} indicator dofs; {report.Method}; median condition number {result.SingularValues.MedianCondition():G3}; kernels {result.Kernels}"));
        screen.Out.WriteLine();
        PrintValidations(screen, report);
        PrintStiffness(screen, report.Evidence.Stiffness);
        PrintRoutes(screen, report.Evidence);
        screen.Out.WriteLine(string.Create(CultureInfo.InvariantCulture, $"the forces hold from {report.Holds.FromHz} to {report.Holds.ToHz} Hz: {report.Holds.Because}"));
        screen.Out.WriteLine(Cautions.Text);
        screen.Out.WriteLine($"wrote {files.Count} files to {folder}: {string.Join(", ", files.Where(IsMain))}");
        screen.Out.WriteLine($"next: hand over {folder}; in an assembly: blocked_forces: {{ file: {IdentificationFiles.Handover}, operation: {result.Operations[0].Name}, part: … }}");
    }

    private static bool IsMain(string file) =>
        file is IdentificationFiles.Handover or IdentificationFiles.Validation or IdentificationFiles.Summary || file.StartsWith("blocked_forces/", StringComparison.Ordinal);

    private static void PrintValidations(Screen screen, IdentificationReport report)
    {
        if (report.Evidence.Validations.Count == 0)
        {
            screen.Out.WriteLine("nothing was validated");
            return;
        }

        var table = new TextTable(("operation", false), ("check", false), ("level", true), ("with phase", true), ("worst third octave", true));
        foreach (OperationValidation validation in report.Evidence.Validations)
        {
            (Engine.Acoustics.OctaveBand band, double worst) = ValidationBands.Worst(validation.Report, 1).DefaultIfEmpty().First();
            table.Add(
                validation.Operation,
                validation.Report.Check == ValidationCheck.OnBoard ? "on board" : "transfer",
                $"{SignedText.Of(validation.Report.OverallLevelDifferenceDb, 2)} dB",
                string.Create(CultureInfo.InvariantCulture, $"{100 * validation.Report.RelativeError:0.##} % off"),
                $"{SignedText.Of(worst, 1)} dB at {band}");
        }

        table.Write(screen.Out);
        foreach (string statement in report.Evidence.Validations.Select(validation => validation.Report.Statement).Distinct())
        {
            screen.Out.WriteLine(statement);
        }

        screen.Out.WriteLine();
    }

    private static void PrintStiffness(Screen screen, BenchStiffness? stiffness)
    {
        if (stiffness is null)
        {
            return;
        }

        var table = new TextTable(("contact force for blocked force", false), ("all forces", true), ("every single dof", true));
        foreach (AgreementLimit limit in stiffness.Agreement)
        {
            table.Add(
                string.Create(CultureInfo.InvariantCulture, $"within {limit.LimitDb} dB"),
                UpTo(limit.UpToHz),
                UpTo(stiffness.AllDofsAgreeUpToHz(limit.LimitDb)));
        }

        table.Write(screen.Out);
        screen.Out.WriteLine();
    }

    private static string UpTo(double? hz) => hz is { } value ? string.Create(CultureInfo.InvariantCulture, $"up to {value:G5} Hz") : "nowhere";

    private static void PrintRoutes(Screen screen, BenchEvidence evidence)
    {
        foreach (RouteResult route in evidence.Routes)
        {
            string nature = route.Forces.Nature == ForceNature.Blocked ? "blocked forces" : "contact forces of this bench, not blocked forces";
            string off = route.Comparison is { } comparison
                ? string.Create(CultureInfo.InvariantCulture, $", {100 * comparison.TotalDifference:0.#} % from the in-situ blocked forces")
                : "";
            screen.Out.WriteLine($"route {route.Name}, {route.Operation}: {nature}{off}");
        }

        if (evidence.Routes.Count > 0)
        {
            screen.Out.WriteLine();
        }
    }
}
