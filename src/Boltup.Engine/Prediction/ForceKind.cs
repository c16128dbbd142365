namespace Boltup.Engine.Prediction;

/// <summary>What a set of forces is, and so where it may act.</summary>
public enum ForceKind
{
    /// <summary>
    /// Blocked forces of a source: they act on the coupled assembly at the source's interface, and say nothing about responses inside
    /// the source (ISO 20270; Moorhouse, Elliott, Evans, JSV 325 (2009) 849).
    /// </summary>
    Blocked,

    /// <summary>Forces that really act, at any dof of any part.</summary>
    Applied,
}
