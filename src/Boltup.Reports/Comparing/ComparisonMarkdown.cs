using System.Globalization;
using System.Text;
using Boltup.Engine.Comparing;
using Boltup.Reports.Results;

namespace Boltup.Reports.Comparing;

/// <summary>The comparison as a comment of a pull request: verdict and levels in sight, the rest in tables that open.</summary>
public static class ComparisonMarkdown
{
    /// <summary>Paths that are worth a row.</summary>
    private const int MostPaths = 3;

    /// <param name="pictures">Names of picture files beside the text; none where there are none.</param>
    public static string Of(ComparisonReport report, IReadOnlyList<string> pictures)
    {
        var text = new StringBuilder();
        text.Append(CultureInfo.InvariantCulture, $"### {MarkdownText.Of(report.BaseFile)} → {MarkdownText.Of(report.ChangedFile)}\n\n**{MarkdownText.Of(ComparisonWords.Verdict(report))}**\n");
        if (report.Differences.Count > 0)
        {
            AppendDifferences(text, report.Differences);
        }

        if (report.Effect is { } effect)
        {
            AppendLevels(text, effect);
            AppendTargets(text, effect);
            AppendNotCompared(text, effect);
            AppendDetails(text, "Third octaves", Bands(effect));
            AppendDetails(text, "Which edit did what, to first order", $"{Edits(effect)}\n{MarkdownText.Of(ComparisonWords.Linearity(effect))}\n");
            AppendDetails(text, "Paths that changed most", Paths(effect));
        }

        AppendDetails(text, "Pictures", string.Join("\n", pictures.Select(picture => $"![{picture}]({Uri.EscapeDataString(picture)})\n")));
        AppendDetails(text, "Inputs and their SHA-256", Inputs(report));
        text.Append(CultureInfo.InvariantCulture, $"\n<sub>boltup {MarkdownText.Of(report.ProgramVersion)}. {Cautions.Text}</sub>\n");
        return text.ToString();
    }

    private static void AppendDifferences(StringBuilder text, IReadOnlyList<InputDifference> differences) => text.Append('\n').Append(Table(
        ["input", "change"],
        [false, false],
        differences.Select(difference => new[]
        {
            MarkdownText.Of(difference.Path), MarkdownText.Of(ComparisonWords.Of(difference)) + (difference.IsRemark ? " (no effect)" : ""),
        })));

    private static void AppendLevels(StringBuilder text, ComparedPredictions effect)
    {
        if (effect.Responses.Count > 0)
        {
            text.Append('\n').Append(Table(
                ["operation", "response", "base", "changed", "change", "dB re", "third octave that changed most"],
                [false, false, true, true, true, false, true],
                effect.Responses.Select(response => new[]
                {
                    MarkdownText.Of(response.Operation),
                    MarkdownText.Of(response.Response),
                    ComparisonWords.Level(response, response.Overall.BasePower),
                    ComparisonWords.Level(response, response.Overall.ChangedPower),
                    SignedText.Of(response.Overall.Decibels, 1),
                    ComparisonWords.ReferenceOf(response).Text,
                    ComparisonWords.LargestBand(response) is { } band ? $"{band.Band}: {SignedText.Of(band.Level.Decibels, 1)}" : "",
                })));
        }
    }

    private static void AppendTargets(StringBuilder text, ComparedPredictions effect)
    {
        string table = Table(
            ["target", "operation", "base", "changed", "outcome"],
            [false, false, false, false, false],
            effect.Targets.Select(target => new[]
            {
                MarkdownText.Of(target.Changed.Target.Name),
                MarkdownText.Of(target.Changed.Operation),
                VerdictText.Margin(target.Base),
                VerdictText.Margin(target.Changed),
                ComparisonWords.Outcome(target),
            }));
        text.Append(table.Length > 0 ? $"\n{table}" : "");
    }

    private static void AppendNotCompared(StringBuilder text, ComparedPredictions effect)
    {
        foreach (string line in effect.NotCompared)
        {
            text.Append(CultureInfo.InvariantCulture, $"\nNot compared: {MarkdownText.Of(line)}.\n");
        }
    }

    /// <summary>One row per third octave, one column per response.</summary>
    private static string Bands(ComparedPredictions effect)
    {
        ResponseChange[] responses = [.. effect.Responses];
        string[] bands = [.. responses.SelectMany(response => response.Bands).Select(band => band.Band).Distinct().OrderBy(band => band.CentreHz).Select(band => band.ToString())];
        bool several = responses.Select(response => response.Operation).Distinct().Count() > 1;
        return Table(
            ["change in dB", .. responses.Select(response => MarkdownText.Of(several ? $"{response.Response}, {response.Operation}" : response.Response))],
            [true, .. responses.Select(_ => true)],
            bands.Select(band => new[] { band }.Concat(responses.Select(response =>
                response.Bands.FirstOrDefault(candidate => candidate.Band.ToString() == band) is { } found ? SignedText.Of(found.Level.Decibels, 1) : "")).ToArray()));
    }

    private static string Edits(ComparedPredictions effect) => Table(
        ["operation", "response", "edit", "first order in dB"],
        [false, false, false, true],
        effect.Responses.SelectMany(response => response.Causes
            .Select(cause => Row(response, cause.Cause, cause.Decibels))
            .Append(Row(response, "all of them", response.LinearDecibels))
            .Append(Row(response, "computed", response.Overall.Decibels))));

    private static string[] Row(ResponseChange response, string edit, double decibels) =>
        [MarkdownText.Of(response.Operation), MarkdownText.Of(response.Response), MarkdownText.Of(edit), SignedText.Of(decibels, 2)];

    private static string Paths(ComparedPredictions effect) => Table(
        ["operation", "response", "path", "base", "changed", "change"],
        [false, false, false, true, true, true],
        effect.Responses.SelectMany(response => response.Paths.Take(MostPaths).Select(path => new[]
        {
            MarkdownText.Of(response.Operation),
            MarkdownText.Of(response.Response),
            MarkdownText.Of(path.Path),
            ComparisonWords.Level(response, path.Level.BasePower),
            ComparisonWords.Level(response, path.Level.ChangedPower),
            SignedText.Of(path.Level.Decibels, 1),
        })));

    private static string Inputs(ComparisonReport report) => Table(
        ["file", "base", "changed"],
        [false, false, false],
        report.BaseInputs.Concat(report.ChangedInputs).Select(input => input.File).Distinct().Select(file => new[]
        {
            MarkdownText.Of(file), Digest(report.BaseInputs, file), Digest(report.ChangedInputs, file),
        }));

    private static string Digest(IReadOnlyList<InputFingerprint> inputs, string file) =>
        inputs.FirstOrDefault(input => input.File == file) is { } found ? found.Sha256[..16] : "";

    private static void AppendDetails(StringBuilder text, string heading, string content)
    {
        if (content.Length > 0)
        {
            // The blank lines are what makes a Markdown reader take the content for Markdown.
            text.Append(CultureInfo.InvariantCulture, $"\n<details><summary>{heading}</summary>\n\n{content}\n</details>\n");
        }
    }

    private static string Table(IReadOnlyList<string> heads, IReadOnlyList<bool> alignsRight, IEnumerable<string[]> rows)
    {
        string[] lines = [.. rows.Select(row => $"| {string.Join(" | ", row)} |\n")];
        return lines.Length == 0
            ? ""
            : $"| {string.Join(" | ", heads)} |\n| {string.Join(" | ", alignsRight.Select(right => right ? "---:" : "---"))} |\n{string.Concat(lines)}";
    }
}
