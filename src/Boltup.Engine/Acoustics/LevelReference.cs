using Boltup.Engine.Spectra;

namespace Boltup.Engine.Acoustics;

/// <summary>What 0 dB is (ISO 1683; from memory).</summary>
/// <param name="Value">In the SI unit of the quantity.</param>
/// <param name="Text">As labels write it.</param>
public sealed record LevelReference(double Value, string Text)
{
    public static readonly LevelReference Force = new(1, "1 N");

    /// <summary>The reference of a quantity; rotations have the same number in their own unit.</summary>
    public static LevelReference For(Quantity quantity, string unit) => quantity switch
    {
        Quantity.Pressure => new LevelReference(20e-6, "20 µPa"),
        Quantity.Acceleration => new LevelReference(1e-6, unit == "m/s²" ? "1 µm/s²" : "1 µrad/s²"),
        Quantity.Velocity => new LevelReference(1e-9, unit == "m/s" ? "1 nm/s" : "1 nrad/s"),
        Quantity.Displacement => new LevelReference(1e-12, unit == "m" ? "1 pm" : "1 prad"),
        _ => Force,
    };

    /// <summary>20 lg(rms / reference).</summary>
    public double Decibels(double rms) => 20 * Math.Log10(rms / Value);
}
