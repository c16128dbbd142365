using Boltup.Config.Binding;
using Boltup.Engine.Geometry;

namespace Boltup.Config.Documents;

/// <summary>A point of six dofs with sensors and impacts around it.</summary>
/// <param name="Sensors">Points whose responses are used, every direction that the data hold.</param>
/// <param name="Impacts">Points whose excitations are used.</param>
/// <param name="Weights">How much a point counts, where it is not 1.</param>
public sealed record VirtualPointDocument(
    Marked<string> Name,
    Marked<Vector3d> At,
    Marked<Rotation>? Axes,
    IReadOnlyList<Marked<string>> Sensors,
    IReadOnlyList<Marked<string>> Impacts,
    IReadOnlyList<(Marked<string> Point, double Weight)> Weights)
{
    /// <summary>The same as a plain point, for placing it.</summary>
    public PointDocument AsPoint => new(Name, null, At, Axes);
}
