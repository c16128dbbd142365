namespace Boltup.Engine.Parts;

/// <summary>A spring and damper between two masses, or between a mass and the ground.</summary>
/// <param name="First">Index of a mass.</param>
/// <param name="Second">Index of a mass, or null for the ground.</param>
/// <param name="Stiffness">In N/m.</param>
/// <param name="LossFactor">Hysteretic damping: the stiffness is k(1+jη).</param>
/// <param name="Damping">Viscous damping in N·s/m.</param>
public sealed record LumpedLink(int First, int? Second, double Stiffness, double LossFactor, double Damping);
