using Boltup.Engine.Geometry;

namespace Boltup.Engine.VirtualPoints;

/// <summary>A point of six dofs whose motion and load are those of a rigid piece with sensors and impacts around it.</summary>
/// <param name="At">Position in m, in the axes of the part.</param>
/// <param name="Axes">Axes of its dofs, in the axes of the part.</param>
public sealed record VirtualPoint(
    string Name, Vector3d At, Rotation Axes, IReadOnlyList<MeasuredChannel> Sensors, IReadOnlyList<MeasuredChannel> Impacts);
