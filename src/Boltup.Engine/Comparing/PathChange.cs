namespace Boltup.Engine.Comparing;

/// <summary>What the contribution of a joint to a response became.</summary>
/// <param name="Path">Name and direction of the joint, as in <c>front left z</c>.</param>
/// <param name="Level">Its contribution alone over all lines; no power on the side that lacks the joint.</param>
public sealed record PathChange(string Path, LevelChange Level)
{
    internal double Moved => Math.Abs(Level.ChangedPower - Level.BasePower);
}
