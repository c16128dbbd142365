using Boltup.Engine.Spectra;

namespace Boltup.Engine.Mounts;

/// <summary>Spring and damper in one direction: stiffness k(1+jη) + jωc.</summary>
/// <param name="Stiffness">k in N/m or N·m/rad.</param>
/// <param name="Damping">Viscous damping c in N·s/m or N·m·s/rad.</param>
public readonly record struct SpringDamper(Direction Direction, double Stiffness, double LossFactor, double Damping);
