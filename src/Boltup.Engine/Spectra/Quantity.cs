namespace Boltup.Engine.Spectra;

/// <summary>
/// The physical quantity of one channel. Rotational dofs use the same word: displacement is then an angle in rad, force a moment in N·m.
/// </summary>
public enum Quantity
{
    Displacement,
    Velocity,
    Acceleration,
    Force,
    Pressure,
    VolumeVelocity,

    /// <summary>A ratio such as coherence.</summary>
    Dimensionless,

    /// <summary>Not said by the file.</summary>
    Unknown,
}
