using Boltup.Config.Binding;
using Boltup.Engine.Geometry;

namespace Boltup.Config.Documents;

/// <summary>A named place on a part.</summary>
/// <param name="Node">The number used in a Universal File.</param>
/// <param name="At">Position in metres in the axes of the part.</param>
/// <param name="Axes">The point's own axes; null when they are those of the part.</param>
public sealed record PointDocument(Marked<string> Name, Marked<int>? Node, Marked<Vector3d>? At, Marked<Rotation>? Axes);
