using System.Globalization;
using Boltup.Cli.Terminal;
using Boltup.Engine.Prediction;
using Boltup.Reports.Results;

namespace Boltup.Cli.Commands;

/// <summary>What a prediction prints: levels of every response, how well the interface could be solved, what was written.</summary>
internal static class PredictionSummary
{
    public static void Print(Screen screen, PredictionResult result, string folder, IReadOnlyList<string> files)
    {
        screen.Out.WriteLine(screen.Ink.Strong(result.Title));
        screen.Out.WriteLine(DescribeRun(result));
        screen.Out.WriteLine();
        if (result.Operations.Any(operation => operation.Responses.Count > 0))
        {
            PrintLevels(screen, result);
            PathSummary.Print(screen, result);
            TargetSummary.Print(screen, result);
            ExposureSummary.Print(screen, result);
        }

        screen.Out.WriteLine(Cautions.Text);
        screen.Out.WriteLine($"wrote {files.Count} files to {folder}: {string.Join(", ", files.Where(IsMain))}");
        screen.Out.WriteLine($"next: look at {Path.Combine(folder, files.FirstOrDefault(file => file == ResultWriter.ReportFile) ?? ResultWriter.SummaryFile)}; change a mount and predict into another folder");
    }

    private static bool IsMain(string file) => file is ResultWriter.ResponsesFile or ResultWriter.JointForcesFile or ResultWriter.SummaryFile;

    private static string DescribeRun(PredictionResult result)
    {
        string condition = result.Conditioning.PerLine.Count == 0
            ? "nothing is joined"
            : string.Create(CultureInfo.InvariantCulture, $"interface condition up to {result.Conditioning.Worst:0.#E+0}");
        return $"{result.Axis}; {condition}; kernels {result.Kernels}";
    }

    private static void PrintLevels(Screen screen, PredictionResult result)
    {
        var table = new TextTable(
            ("operation", false), ("response", false), ("overall", true), ("dB re", false), ("strongest line", true));
        foreach (OperationResult operation in result.Operations)
        {
            foreach (ResponseSpectrum response in operation.Responses)
            {
                OverallLevel level = OverallLevel.Of(response, operation.Axis, operation.Amplitude);
                table.Add(
                    operation.Name,
                    response.Name,
                    string.Create(CultureInfo.InvariantCulture, $"{level.Decibels:F1}"),
                    level.Reference.Text,
                    string.Create(CultureInfo.InvariantCulture, $"{level.PeakDecibels:F1} at {level.PeakHz:G5} Hz"));
            }
        }

        table.Write(screen.Out);
        screen.Out.WriteLine();
    }
}
