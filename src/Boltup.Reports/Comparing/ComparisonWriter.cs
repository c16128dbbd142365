using System.Text;
using Boltup.Engine.Diagnostics;
using Boltup.Reports.Pictures;
using Boltup.Reports.Results;

namespace Boltup.Reports.Comparing;

/// <summary>Writes what a comparison leaves behind.</summary>
public static class ComparisonWriter
{
    public const string JsonFile = "comparison.json";
    public const string MarkdownFile = "comparison.md";

    /// <summary>Replaces earlier results in a folder as a whole.</summary>
    /// <returns>Names of the files in the folder, or null after an error in <paramref name="diagnostics"/>.</returns>
    public static IReadOnlyList<string>? Write(ComparisonReport report, string folder, bool withPictures, DiagnosticBag diagnostics)
    {
        using OutputFolder? output = OutputFolder.Prepare(folder, diagnostics);
        if (output is null)
        {
            return null;
        }

        IReadOnlyList<Picture> pictures = withPictures && report.Effect is { } effect ? ComparisonPages.All(effect, Provenance(report)) : [];
        output.Write(JsonFile, stream => ComparisonJson.Write(stream, report));
        output.Write(MarkdownFile, stream => stream.Write(Encoding.UTF8.GetBytes(ComparisonMarkdown.Of(report, NamesOf(pictures)))));
        Parallel.ForEach(pictures, picture => output.Write($"{picture.Name}.png", stream => stream.Write(PictureDrawer.DrawPng(picture))));
        return output.Commit(diagnostics);
    }

    private static string[] NamesOf(IReadOnlyList<Picture> pictures) => [.. pictures.Select(picture => $"{picture.Name}.png").Order(StringComparer.Ordinal)];

    private static string Provenance(ComparisonReport report) =>
        $"inputs {InputFingerprint.Abbreviate(report.BaseInputs)} → {InputFingerprint.Abbreviate(report.ChangedInputs)} · boltup {report.ProgramVersion}";
}
