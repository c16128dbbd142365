using System.Globalization;
using Boltup.Engine.Targets;

namespace Boltup.Reports.Results;

/// <summary>Verdicts in words.</summary>
public static class VerdictText
{
    /// <summary>Such as <c>69.1 dB(A)</c>, with the third octave that decides.</summary>
    public static string Level(TargetVerdict verdict)
    {
        string weighting = verdict.Target.Weighting == Engine.Acoustics.FrequencyWeighting.Z ? "" : $"({verdict.Target.Weighting})";
        string band = verdict.Band is { } third ? $" in {third}" : "";
        return verdict.IsJudged ? string.Create(CultureInfo.InvariantCulture, $"{verdict.LevelDb:F1} dB{weighting}{band}") : "not judged";
    }

    /// <summary>Met or missed, and by how much.</summary>
    public static string Margin(TargetVerdict verdict) => !verdict.IsJudged ? "not judged"
        : verdict.IsMissed ? string.Create(CultureInfo.InvariantCulture, $"missed by {-verdict.MarginDb:F1} dB")
        : string.Create(CultureInfo.InvariantCulture, $"met, {verdict.MarginDb:F1} dB to spare");

    /// <summary>What would meet a target that is missed; null for one that is met.</summary>
    public static string? Cure(TargetVerdict verdict)
    {
        if (verdict.Reduction is not { } reduction)
        {
            return null;
        }

        string[] alone = [.. reduction.Joints.Where(path => path.Decibels is not null).OrderBy(path => path.Decibels)
            .Take(3).Select(path => string.Create(CultureInfo.InvariantCulture, $"{path.Path.Name} {path.Decibels:F1} dB"))];
        string paths = alone.Length == 0 ? "no path alone can do it" : $"or one path alone: {string.Join(", ", alone)}";
        return string.Create(
            CultureInfo.InvariantCulture,
            $"to meet it: all forces {-reduction.AllForcesChange:F1} dB lower, {paths}; blocked forces without a common phase may have at most {Signed(reduction.UniformForceLevel)} dB re 1 N in every third octave");
    }

    private static string Signed(double level) => string.Create(CultureInfo.InvariantCulture, $"{level:F1}").Replace('-', '−');
}
