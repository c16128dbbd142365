using Boltup.Config.Binding;
using Boltup.Config.Yaml;

namespace Boltup.Config.Documents;

/// <summary>A part file: one substructure, measured or modelled.</summary>
/// <param name="Points">The listed points in the order of the file; empty when names come from the data.</param>
/// <param name="FillsReciprocity">The <c>reciprocity: fill</c> key, when a measured Y_ji may stand for a missing Y_ij.</param>
public sealed record PartDocument(
    SourceFile Source,
    Marked<string>? Title,
    IReadOnlyList<PointDocument> Points,
    PartModelDocument Model,
    Marked<bool>? FillsReciprocity,
    IReadOnlyList<VirtualPointDocument> VirtualPoints)
{
    /// <summary>The nodes that it was bound from.</summary>
    public required YamlMap Root { get; init; }

    /// <summary>Listed points, then virtual ones.</summary>
    public IEnumerable<PointDocument> AllPoints => Points.Concat(VirtualPoints.Select(point => point.AsPoint));

    /// <summary>Names of all points as far as the document tells, or null when only the data know them.</summary>
    public IReadOnlyList<string>? KnownPoints => Model switch
    {
        LumpedModelDocument lumped => [.. lumped.Masses.Select(mass => mass.Point.Value)],
        _ when Points.Count > 0 => [.. AllPoints.Select(point => point.Name.Value)],
        _ => null,
    };
}
