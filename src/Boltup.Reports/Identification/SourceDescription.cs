using Boltup.Engine.Geometry;

namespace Boltup.Reports.Identification;

/// <summary>What the bench says of the source's interface, for the handover.</summary>
/// <param name="MountsBelongToSource">Whether the forces act below the mounts; null when the bench does not say.</param>
/// <param name="Points">Interface points with position (m) and axes, where they are known.</param>
public sealed record SourceDescription(
    bool? MountsBelongToSource, IReadOnlyList<(string Name, int? Node, Vector3d? At, Rotation? Axes)> Points);
