using Boltup.Engine.Spectra;

namespace Boltup.Engine.Paths;

/// <summary>Where a force of an operation acts: a dof of a part, along the part's own directions as its force file has them.</summary>
public sealed record ForceDof(string Part, Dof Own)
{
    public override string ToString() => $"{Part}.{Own}";
}
