using Boltup.Engine.Spectra;

namespace Boltup.Engine.Coupling;

/// <summary>
/// One row of the signed Boolean matrix B: one direction of a joint. A mount with mass effect has two rows for a direction, one with an
/// entry at the first point only and one with an entry at the second only; λ is the force at that end, in the same sense at both.
/// </summary>
public sealed record Constraint(Joint Joint, Direction Direction, JointSide Side = JointSide.Both)
{
    /// <summary>Name of the joint, with the end where it is the first of a mount whose ends carry different forces.</summary>
    public string JointName => Side == JointSide.First ? $"{Joint.Name}, first end" : Joint.Name;

    public override string ToString() => $"{JointName} {Dof.NameOf(Direction)}";
}
