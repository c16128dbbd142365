using Boltup.Engine.Diagnostics;
using Boltup.Engine.Prediction;
using Boltup.Reports.Html;
using Boltup.Reports.Pictures;

namespace Boltup.Reports.Results;

/// <summary>Writes everything that a prediction leaves behind.</summary>
public static class ResultWriter
{
    public const string ResponsesFile = "responses.csv";
    public const string JointForcesFile = "joint_forces.csv";
    public const string LevelsFile = "levels.csv";
    public const string BandsFile = "bands.csv";
    public const string TonesFile = "tones.csv";
    public const string ContributionsFile = "contributions.csv";
    public const string ContributionLinesFile = "contribution_lines.csv";
    public const string SensitivityFile = "sensitivity.csv";
    public const string SummaryFile = "summary.json";
    public const string ReportFile = "report.html";

    /// <summary>Writes data files, and pictures side by side with them, and replaces earlier results as a whole.</summary>
    /// <param name="fingerprints">Fingerprints of all inputs.</param>
    /// <returns>Names of the files in the folder, or null after an error in <paramref name="diagnostics"/>.</returns>
    public static IReadOnlyList<string>? Write(
        PredictionResult result, IReadOnlyList<InputFingerprint> fingerprints, string folder, ResultOptions options, DiagnosticBag diagnostics)
    {
        using OutputFolder? output = OutputFolder.Prepare(folder, diagnostics);
        if (output is null)
        {
            return null;
        }

        Parallel.Invoke(
            () => output.Write(ResponsesFile, stream => ResultTables.WriteResponses(stream, result)),
            () => output.Write(JointForcesFile, stream => ResultTables.WriteJointForces(stream, result)),
            () => output.Write(SummaryFile, stream => SummaryJson.Write(stream, result, fingerprints, options.ProgramVersion)),
            () => output.Write(ReportFile, stream => PageRenderer.Write(stream, result, fingerprints, options.ProgramVersion)),
            () => output.Write(LevelsFile, stream => LevelTables.WriteLevels(stream, result)),
            () => output.Write(BandsFile, stream => LevelTables.WriteBands(stream, result)),
            () => output.Write(TonesFile, stream => ToneTable.Write(stream, result)),
            () => WritePaths(result, output, options),
            () => WritePictures(result, fingerprints, output, options));
        return output.Commit(diagnostics);
    }

    private static void WritePaths(PredictionResult result, OutputFolder output, ResultOptions options)
    {
        if (!result.Operations.Any(operation => operation.RankedPaths.Count > 0))
        {
            return;
        }

        output.Write(ContributionsFile, stream => PathTables.WriteContributions(stream, result));
        output.Write(SensitivityFile, stream => SensitivityTables.Write(stream, result));
        if (options.PathLines)
        {
            output.Write(ContributionLinesFile, stream => PathTables.WriteLines(stream, result));
        }
    }

    private static void WritePictures(
        PredictionResult result, IReadOnlyList<InputFingerprint> fingerprints, OutputFolder output, ResultOptions options)
    {
        if (options.Pictures)
        {
            var pages = new PicturePages(result, $"inputs {InputFingerprint.Abbreviate(fingerprints)} · boltup {options.ProgramVersion}");
            Parallel.ForEach(pages.All(), picture => output.Write($"{picture.Name}.png", stream => stream.Write(PictureDrawer.DrawPng(picture))));
        }
    }
}
