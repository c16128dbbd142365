using Boltup.Engine.Spectra;

namespace Boltup.Files.UniversalFile;

/// <summary>What the numbers of a dataset 58 mean.</summary>
internal static class DataTypes
{
    public const int ReactionForce = 9;

    public const int Frequency = 18;

    private static readonly string[] VolumeVelocityUnits = ["m^3/s", "m3/s", "m³/s"];

    public static FunctionKind KindOf(int functionType) => functionType switch
    {
        0 => FunctionKind.General,
        2 => FunctionKind.AutoSpectrum,
        3 => FunctionKind.CrossSpectrum,
        4 => FunctionKind.Frf,
        5 => FunctionKind.Transmissibility,
        6 => FunctionKind.Coherence,
        9 => FunctionKind.PowerSpectralDensity,
        12 => FunctionKind.Spectrum,
        27 => FunctionKind.Order,
        _ => FunctionKind.Other,
    };

    /// <summary>The quantity of a specific data type; volume velocity has none and is told by its unit.</summary>
    public static Quantity QuantityOf(AxisField field) => field.DataType switch
    {
        8 => Quantity.Displacement,
        ReactionForce or 13 => Quantity.Force,
        11 => Quantity.Velocity,
        12 => Quantity.Acceleration,
        15 => Quantity.Pressure,
        _ when VolumeVelocityUnits.Contains(field.Unit, StringComparer.OrdinalIgnoreCase) => Quantity.VolumeVelocity,
        _ => Quantity.Unknown,
    };
}
