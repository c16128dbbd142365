using Boltup.Engine.Spectra;

namespace Boltup.Engine.Parts;

/// <summary>
/// A direction at a point of a part, as a sum of the part's own dofs times direction cosines. Motion along the direction is the sum
/// of the terms; a force along it acts on each dof times its cosine.
/// </summary>
public sealed class DofCombination(IReadOnlyList<DofTerm> terms) : IEquatable<DofCombination>
{
    public IReadOnlyList<DofTerm> Terms { get; } = terms;

    /// <summary>Whether it is just one of the part's own dofs.</summary>
    public bool IsOwnDof => Terms.Count == 1 && Terms[0].Cosine == 1;

    /// <summary>One of the part's own dofs.</summary>
    public static DofCombination Own(Dof dof) => new([new DofTerm(dof, 1)]);

    public bool Equals(DofCombination? other) => other is not null && Terms.SequenceEqual(other.Terms);

    public override bool Equals(object? obj) => Equals(obj as DofCombination);

    public override int GetHashCode() => Terms[0].GetHashCode();

    public override string ToString() => string.Join(" + ", Terms.Select(term => term.Dof));
}
