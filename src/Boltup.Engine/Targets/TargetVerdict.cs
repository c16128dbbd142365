using Boltup.Engine.Acoustics;
using Boltup.Engine.Paths;

namespace Boltup.Engine.Targets;

/// <summary>Whether one operation keeps a target.</summary>
/// <param name="LevelDb">Level that decides: the overall one, or that of the third octave with the smallest margin. NaN when no line counts.</param>
/// <param name="LimitDb">The limit beside it.</param>
/// <param name="Band">The third octave that decides; null for an overall limit.</param>
/// <param name="Reference">What 0 dB is.</param>
/// <param name="Reduction">What must drop for the target to be kept; null when it is kept, or paths were not computed.</param>
public sealed record TargetVerdict(
    Target Target, string Operation, double LevelDb, double LimitDb, OctaveBand? Band, LevelReference Reference, RequiredReduction? Reduction)
{
    /// <summary>Limit minus level in dB: negative when the target is missed.</summary>
    public double MarginDb => LimitDb - LevelDb;

    public bool IsMissed => MarginDb < 0;

    /// <summary>Whether any line of the operation counts.</summary>
    public bool IsJudged => !double.IsNaN(LevelDb);
}
