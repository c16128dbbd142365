namespace Boltup.Config.Units;

/// <summary>A kind of physical quantity that a value of a document can have.</summary>
/// <param name="Name">Its name in messages, with the article.</param>
/// <param name="CustomaryUnit">The unit in which the trade usually writes it; helps show it.</param>
/// <param name="SiUnit">The unit of the value that the parser returns.</param>
public sealed record Dimension(string Name, string CustomaryUnit, string SiUnit)
{
    public static readonly Dimension Length = new("a length", "mm", "m");
    public static readonly Dimension Mass = new("a mass", "kg", "kg");
    public static readonly Dimension Time = new("a time", "s", "s");
    public static readonly Dimension Frequency = new("a frequency", "Hz", "Hz");
    public static readonly Dimension RotationalSpeed = new("a rotational speed", "rpm", "rad/s");
    public static readonly Dimension Angle = new("an angle", "deg", "rad");
    public static readonly Dimension Force = new("a force", "N", "N");
    public static readonly Dimension Moment = new("a moment", "N·m", "N·m");
    public static readonly Dimension Stiffness = new("a stiffness", "N/mm", "N/m");
    public static readonly Dimension RotationalStiffness = new("a rotational stiffness", "N·m/rad", "N·m/rad");
    public static readonly Dimension CouplingStiffness = new("a stiffness between translation and rotation", "N/rad", "N/rad");
    public static readonly Dimension Damping = new("a damping", "N·s/m", "N·s/m");
    public static readonly Dimension RotationalDamping = new("a rotational damping", "N·m·s/rad", "N·m·s/rad");
    public static readonly Dimension Inertia = new("a moment of inertia", "kg·m²", "kg·m²");
    public static readonly Dimension Pressure = new("a pressure", "Pa", "Pa");
    public static readonly Dimension Velocity = new("a velocity", "m/s", "m/s");
    public static readonly Dimension Acceleration = new("an acceleration", "m/s²", "m/s²");
    public static readonly Dimension VolumeVelocity = new("a volume velocity", "m³/s", "m³/s");
    public static readonly Dimension Density = new("a density", "kg/m³", "kg/m³");
    public static readonly Dimension Level = new("a level", "dB", "dB");
    public static readonly Dimension Temperature = new("a temperature", "degC", "K");
}
