using System.Globalization;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Prediction;
using Boltup.Engine.Targets;
using Boltup.Reports.Results;

namespace Boltup.Reports.Html;

/// <summary>The sentences at the top of the page.</summary>
internal static class PageVerdict
{
    /// <summary>The highest level of every quantity, because levels of different references do not compare; then what the run complained of.</summary>
    public static IReadOnlyList<string> Of(IReadOnlyList<PageLevel> levels, PredictionResult result) =>
        [.. result.Verdicts.Select(Sentence), .. levels.GroupBy(level => level.Level.Reference.Text).Select(Highest), Complaints(result)];

    private static string Sentence(TargetVerdict verdict)
    {
        string cure = VerdictText.Cure(verdict) is { } words ? $" ({words})" : "";
        return string.Create(
            CultureInfo.InvariantCulture,
            $"Target {verdict.Target.Name}, {verdict.Operation}: {VerdictText.Margin(verdict)}; {verdict.Target.Response} has {VerdictText.Level(verdict)} re {verdict.Reference.Text}, limit {verdict.LimitDb:0.#} dB{cure}.");
    }

    private static string Highest(IEnumerable<PageLevel> levels)
    {
        PageLevel[] known = [.. levels.Where(level => double.IsFinite(level.Level.Decibels))];
        return known.Length == 0
            ? $"No level re {levels.First().Level.Reference.Text} is known."
            : Sentence(known.MaxBy(level => level.Level.Decibels)!);
    }

    private static string Sentence(PageLevel level) => string.Create(
        CultureInfo.InvariantCulture,
        $"Highest level re {level.Level.Reference.Text}: {level.Level.Text} at {level.Response} in {level.Operation}, strongest line {level.Level.PeakHz:G5} Hz.");

    private static string Complaints(PredictionResult result)
    {
        int warnings = result.Diagnostics.Count(item => item.Severity == Severity.Warning);
        return warnings switch
        {
            0 => "No warnings.",
            1 => "One warning, explained below: read it before relying on the levels.",
            _ => string.Create(CultureInfo.InvariantCulture, $"{warnings} warnings, explained below: read them before relying on the levels."),
        };
    }
}
