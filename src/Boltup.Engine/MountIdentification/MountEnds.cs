namespace Boltup.Engine.MountIdentification;

/// <summary>The two points of an installation between which a mount sits.</summary>
public sealed record MountEnds(string First, string Second)
{
    public override string ToString() => $"{First} to {Second}";
}
