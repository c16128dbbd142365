using Boltup.Engine.Spectra;

namespace Boltup.Engine.Coupling;

/// <summary>One row of the signed Boolean matrix B: one direction of a joint.</summary>
public sealed record Constraint(Joint Joint, Direction Direction)
{
    public override string ToString() => $"{Joint.Name} {Dof.NameOf(Direction)}";
}
