using Boltup.Config.Binding;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Spectra;

namespace Boltup.Config.Documents;

/// <summary>A connection of two points.</summary>
/// <param name="Rigid">The directions that it locks, empty for a resilient joint.</param>
/// <param name="Mount">The mount it goes through, null for a rigid joint.</param>
public sealed record JointDocument(
    Marked<string> Name, JointEndDocument First, JointEndDocument Second, IReadOnlyList<Marked<Direction>> Rigid, Marked<string>? Mount);

/// <summary>One end of a joint: a point of a part, or ground.</summary>
/// <param name="Part">Name of the part, null for ground.</param>
/// <param name="Point">Name of the point, null for ground.</param>
public sealed record JointEndDocument(string? Part, string? Point, SourceSpan Span)
{
    public bool IsGround => Part is null;

    public override string ToString() => IsGround ? "ground" : $"{Part}.{Point}";
}
