namespace Boltup.Engine.Coupling;

/// <summary>One entry of B: where a part takes part in a constraint.</summary>
/// <param name="Constraint">Row of B.</param>
/// <param name="Sign">+1 at the first point of the joint, −1 at the second.</param>
/// <param name="Interface">Row and column of the part's interface FRFs.</param>
public readonly record struct ConstraintEnd(int Constraint, double Sign, int Interface);
