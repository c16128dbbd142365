using Boltup.Engine.Spectra;

namespace Boltup.Engine.Mounts;

/// <summary>Driving-point and transfer stiffness of one direction over frequency (ISO 10846-1): F₁ = k₁₁u₁ + k₁₂u₂, F₂ = k₂₁u₁ + k₂₂u₂.</summary>
/// <remarks>Forces and displacements point the same way at both ends, so that k₁₂ of a soft mount without mass is minus its stiffness.</remarks>
public sealed record TwoPortTable(StiffnessTable K11, StiffnessTable K12, StiffnessTable K21, StiffnessTable K22)
{
    public Direction Direction => K11.Direction;

    internal IEnumerable<StiffnessTable> Terms => [K11, K12, K21, K22];
}
