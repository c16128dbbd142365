using System.Globalization;
using Boltup.Cli.Terminal;
using Boltup.Engine.Prediction;
using Boltup.Engine.Targets;
using Boltup.Reports.Results;

namespace Boltup.Cli.Commands;

/// <summary>Targets, met or missed, and what would meet those that are missed.</summary>
internal static class TargetSummary
{
    public static void Print(Screen screen, PredictionResult result)
    {
        if (result.Verdicts.Count == 0)
        {
            return;
        }

        var table = new TextTable(("target", false), ("operation", false), ("level", true), ("limit", true), ("verdict", false));
        foreach (TargetVerdict verdict in result.Verdicts)
        {
            table.Add(
                verdict.Target.Name,
                verdict.Operation,
                VerdictText.Level(verdict),
                string.Create(CultureInfo.InvariantCulture, $"{verdict.LimitDb:0.#} dB"),
                VerdictText.Margin(verdict));
        }

        table.Write(screen.Out);
        foreach (TargetVerdict verdict in result.Verdicts)
        {
            if (VerdictText.Cure(verdict) is { } cure)
            {
                screen.Out.WriteLine($"{verdict.Target.Name}, {verdict.Operation}: {cure}");
            }
        }

        screen.Out.WriteLine();
    }
}
