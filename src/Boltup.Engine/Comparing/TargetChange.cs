using Boltup.Engine.Targets;

namespace Boltup.Engine.Comparing;

/// <summary>What became of a target in one operation; a target that was edited is judged by its own limit on either side.</summary>
public sealed record TargetChange(TargetVerdict Base, TargetVerdict Changed)
{
    /// <summary>Kept before, missed now.</summary>
    public bool IsLost => IsKept(Base) && Changed.IsMissed;

    /// <summary>Missed before, kept now.</summary>
    public bool IsGained => Base.IsMissed && IsKept(Changed);

    private static bool IsKept(TargetVerdict verdict) => verdict.IsJudged && !verdict.IsMissed;
}
