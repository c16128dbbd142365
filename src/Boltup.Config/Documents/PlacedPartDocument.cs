using Boltup.Config.Binding;
using Boltup.Engine.Geometry;

namespace Boltup.Config.Documents;

/// <summary>A part of an assembly with its place.</summary>
/// <param name="Turned">Rotation about the part's origin, applied before <paramref name="Moved"/>.</param>
/// <param name="Moved">Translation in metres along the axes of the assembly.</param>
/// <param name="Document">The part file, or null while that could not be loaded; never null in a loaded assembly.</param>
public sealed record PlacedPartDocument(
    Marked<string> Name, FileReference File, TurnDocument? Turned, Marked<Vector3d>? Moved, PartDocument? Document);

/// <summary>A right-handed rotation.</summary>
/// <param name="About">Unit vector along the axis of rotation.</param>
/// <param name="AngleRad">Angle in rad.</param>
public sealed record TurnDocument(Marked<Vector3d> About, Marked<double> AngleRad);
