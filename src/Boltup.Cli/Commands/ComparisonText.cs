using Boltup.Cli.Terminal;
using Boltup.Engine.Comparing;
using Boltup.Reports.Comparing;
using Boltup.Reports.Results;

namespace Boltup.Cli.Commands;

/// <summary>What a comparison prints for people at a terminal.</summary>
internal static class ComparisonText
{
    /// <summary>Paths that are worth a row.</summary>
    private const int MostPaths = 5;

    public static void Print(Screen screen, ComparisonReport report, bool isFull)
    {
        screen.Out.WriteLine(screen.Ink.Strong($"{report.BaseFile} → {report.ChangedFile}"));
        foreach (InputDifference difference in report.Differences)
        {
            screen.Out.WriteLine($"  {difference.Path}: {ComparisonWords.Of(difference)}{(difference.IsRemark ? " (no effect)" : "")}");
        }

        if (report.Effect is { } effect)
        {
            PrintEffect(screen, effect, isFull);
        }

        screen.Out.WriteLine(screen.Ink.Strong(ComparisonWords.Verdict(report)));
    }

    private static void PrintEffect(Screen screen, ComparedPredictions effect, bool isFull)
    {
        screen.Out.WriteLine();
        if (effect.Responses.Count > 0)
        {
            PrintLevels(screen, effect);
            screen.Out.WriteLine(ComparisonWords.Linearity(effect));
            screen.Out.WriteLine();
        }

        PrintTargets(screen, effect);
        foreach (ResponseChange response in isFull ? effect.Responses : [])
        {
            PrintResponse(screen, response);
        }
    }

    private static void PrintLevels(Screen screen, ComparedPredictions effect)
    {
        var table = new TextTable(
            ("operation", false), ("response", false), ("base", true), ("changed", true), ("change", true), ("dB re", false),
            ("first order", true), ("largest edit", false), ("third octave", false));
        foreach (ResponseChange response in effect.Responses)
        {
            table.Add(
                response.Operation,
                response.Response,
                ComparisonWords.Level(response, response.Overall.BasePower),
                ComparisonWords.Level(response, response.Overall.ChangedPower),
                SignedText.Of(response.Overall.Decibels, 1),
                ComparisonWords.ReferenceOf(response).Text,
                response.Causes.Count == 0 ? "" : SignedText.Of(response.LinearDecibels, 1),
                response.Causes.Count == 0 ? "" : $"{response.Causes[0].Cause} {SignedText.Of(response.Causes[0].Decibels, 1)}",
                ComparisonWords.LargestBand(response) is { } band ? $"{band.Band} {SignedText.Of(band.Level.Decibels, 1)}" : "");
        }

        table.Write(screen.Out);
    }

    private static void PrintTargets(Screen screen, ComparedPredictions effect)
    {
        if (effect.Targets.Count == 0)
        {
            return;
        }

        var table = new TextTable(("target", false), ("operation", false), ("base", false), ("changed", false), ("outcome", false));
        foreach (TargetChange target in effect.Targets)
        {
            table.Add(
                target.Changed.Target.Name,
                target.Changed.Operation,
                VerdictText.Margin(target.Base),
                VerdictText.Margin(target.Changed),
                ComparisonWords.Outcome(target));
        }

        table.Write(screen.Out);
        screen.Out.WriteLine();
    }

    private static void PrintResponse(Screen screen, ResponseChange response)
    {
        screen.Out.WriteLine(screen.Ink.Strong($"{response.Response} in {response.Operation}, dB re {ComparisonWords.ReferenceOf(response).Text}"));
        PrintTable(screen, response, "third octave", response.Bands.Select(band => (band.Band.ToString(), band.Level)));
        PrintTable(screen, response, "path", response.Paths.Take(MostPaths).Select(path => (path.Path, path.Level)));
        if (response.Causes.Count > 0)
        {
            var edits = new TextTable(("edit", false), ("first order", true));
            foreach (AttributedChange cause in response.Causes)
            {
                edits.Add(cause.Cause, SignedText.Of(cause.Decibels, 2));
            }

            edits.Write(screen.Out);
            screen.Out.WriteLine();
        }
    }

    private static void PrintTable(Screen screen, ResponseChange response, string head, IEnumerable<(string Name, LevelChange Level)> rows)
    {
        var table = new TextTable((head, false), ("base", true), ("changed", true), ("change", true));
        foreach ((string name, LevelChange level) in rows)
        {
            table.Add(
                name, ComparisonWords.Level(response, level.BasePower), ComparisonWords.Level(response, level.ChangedPower), SignedText.Of(level.Decibels, 1));
        }

        table.Write(screen.Out);
        screen.Out.WriteLine();
    }
}
