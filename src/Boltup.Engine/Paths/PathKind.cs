namespace Boltup.Engine.Paths;

/// <summary>What a path begins with.</summary>
public enum PathKind
{
    /// <summary>A force of the operation.</summary>
    Force,

    /// <summary>One direction of a joint.</summary>
    Joint,

    /// <summary>All forces that act on the response's own part, as far as they need no joint.</summary>
    Direct,
}
