using System.Globalization;
using Boltup.Engine.Acoustics;
using Boltup.Engine.Comparing;
using Boltup.Reports.Results;

namespace Boltup.Reports.Comparing;

/// <summary>The words in which text and Markdown say the same things.</summary>
public static class ComparisonWords
{
    /// <summary>First-order effects count as right up to this share of a change.</summary>
    private const double HoldsWithin = 0.2;

    /// <summary>Or up to this many dB.</summary>
    private const double HoldsWithinDb = 0.1;

    /// <summary>The outcome in one sentence.</summary>
    public static string Verdict(ComparisonReport report)
    {
        if (report.Differences.Count == 0)
        {
            return "The inputs are identical.";
        }

        if (report.Effect is not { } effect)
        {
            return "Nothing differs that a result depends on.";
        }

        if (effect.Responses.Count == 0)
        {
            return "The assemblies have no response in common.";
        }

        return $"{Levels(report, effect)}{Targets(effect)}";
    }

    private static string Levels(ComparisonReport report, ComparedPredictions effect)
    {
        string tolerance = Number(report.ToleranceDb);
        return report.Regressions.Count == 0
            ? $"No response rises by more than {tolerance} dB."
            : $"{report.Regressions.Count} of {Responses(effect.Responses.Count)} {(report.Regressions.Count == 1 ? "rises" : "rise")} by more than {tolerance} dB: "
                + $"{string.Join(", ", report.Regressions.Select(Rise))}.";
    }

    private static string Targets(ComparedPredictions effect)
    {
        string[] lost = [.. effect.Targets.Where(target => target.IsLost).Select(Name)];
        string[] gained = [.. effect.Targets.Where(target => target.IsGained).Select(Name)];
        return (lost.Length > 0 ? $" Targets lost: {string.Join(", ", lost)}." : "") + (gained.Length > 0 ? $" Targets gained: {string.Join(", ", gained)}." : "");
    }

    private static string Name(TargetChange target) => $"{target.Changed.Target.Name} in {target.Changed.Operation}";

    /// <summary>What became of a target, in a word; nothing for one that is as it was.</summary>
    public static string Outcome(TargetChange target) => target.IsLost ? "lost" : target.IsGained ? "gained" : "";

    /// <summary>One difference, as in <c>420 N/mm → 300 N/mm (−28.6 %)</c>.</summary>
    public static string Of(InputDifference difference) => difference.Kind switch
    {
        InputDifferenceKind.Added => $"added {difference.After}",
        InputDifferenceKind.Removed => $"removed {difference.Before}",
        InputDifferenceKind.Content => $"content {difference.Before} → {difference.After}",
        _ => $"{difference.Before} → {difference.After}{Relative(difference)}",
    };

    /// <summary>A level of a response in dB.</summary>
    public static string Level(ResponseChange response, double power)
    {
        double decibels = ReferenceOf(response).Decibels(Math.Sqrt(power));
        return double.IsFinite(decibels) ? decibels.ToString("F1", CultureInfo.InvariantCulture) : "–";
    }

    public static LevelReference ReferenceOf(ResponseChange response) => LevelReference.For(response.Quantity, response.Unit);

    /// <summary>The third octave that changed most among those that matter: within 20 dB of the strongest on either side.</summary>
    public static BandChange? LargestBand(ResponseChange response)
    {
        double strongest = response.Bands.Select(StrongerPower).DefaultIfEmpty().Max();
        return response.Bands.Where(band => StrongerPower(band) >= 0.01 * strongest && double.IsFinite(band.Level.Decibels))
            .MaxBy(band => Math.Abs(band.Level.Decibels));
    }

    /// <summary>How far the first-order effects of the edits explain the changes.</summary>
    public static string Linearity(ComparedPredictions effect)
    {
        int holds = effect.Responses.Count(Holds);
        string missing = effect.NotAttributed.Count == 0 ? "" : $" Not attributed: {string.Join("; ", effect.NotAttributed)}.";
        return $"First-order effects add up to the change, within {100 * HoldsWithin:F0} % or {Number(HoldsWithinDb)} dB, "
            + $"for {holds} of {Responses(effect.Responses.Count)}; elsewhere the edits are too large to be told apart by their slopes.{missing}";
    }

    private static bool Holds(ResponseChange response) =>
        Math.Abs(response.LinearDecibels - response.Overall.Decibels) <= Math.Max(HoldsWithinDb, HoldsWithin * Math.Abs(response.Overall.Decibels));

    private static string Rise(ResponseChange response) => $"{response.Response} in {response.Operation} {SignedText.Of(response.Overall.Decibels, 1)} dB";

    private static double StrongerPower(BandChange band) => Math.Max(band.Level.BasePower, band.Level.ChangedPower);

    private static string Relative(InputDifference difference) =>
        difference.Relative is { } relative ? $" ({SignedText.Of(100 * relative, 1)} %)" : "";

    private static string Responses(int count) => count == 1 ? "1 response" : string.Create(CultureInfo.InvariantCulture, $"{count} responses");

    private static string Number(double value) => value.ToString(CultureInfo.InvariantCulture);
}
