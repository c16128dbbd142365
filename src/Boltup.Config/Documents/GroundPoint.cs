namespace Boltup.Config.Documents;

/// <summary>The reserved name of the immovable point.</summary>
public static class GroundPoint
{
    public const string Name = "ground";
}
