using Boltup.Engine.Geometry;

namespace Boltup.Config.Documents;

/// <summary>The axes of a point in those of its part: three orthonormal vectors that form a right-handed set.</summary>
public sealed record PointAxes(Vector3d X, Vector3d Y, Vector3d Z);
