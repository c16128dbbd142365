using Boltup.Engine.Geometry;

namespace Boltup.Engine.Parts;

/// <summary>A named place on a part.</summary>
/// <param name="At">Position in the part's axes in m, if known.</param>
/// <param name="Axes">The point's own axes, as components in the part's axes.</param>
public sealed record PartPoint(string Name, Vector3d? At, Rotation Axes);
