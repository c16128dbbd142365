using Boltup.Engine.Spectra;

namespace Boltup.Files.UniversalFile;

/// <summary>
/// Units of a file (dataset 164): SI = value / factor, for length and force. The factors count, not the unit code; without a dataset 164
/// values are in SI units.
/// </summary>
internal sealed record UnitSystem(double LengthFactor, double ForceFactor)
{
    public static readonly UnitSystem Si = new(1, 1);

    /// <summary>Factor from a value of the file to SI.</summary>
    /// <param name="field">The axis, whose exponents count where it has any.</param>
    public double ToSi(AxisField field, Quantity quantity, Direction? direction)
    {
        (int length, int force) = field.HasExponents ? (field.LengthExponent, field.ForceExponent) : ExponentsOf(quantity, direction);
        return 1 / (Math.Pow(LengthFactor, length) * Math.Pow(ForceFactor, force));
    }

    /// <summary>Whether the exponents of a power's axis differ from those of its quantity, and so must be those of the power.</summary>
    public static bool AreOfPower(AxisField field, Quantity quantity, Direction? direction) =>
        field.HasExponents && (field.LengthExponent, field.ForceExponent) != ExponentsOf(quantity, direction);

    private static (int Length, int Force) ExponentsOf(Quantity quantity, Direction? direction)
    {
        bool rotates = direction is >= Direction.RX and <= Direction.RZ;
        return quantity switch
        {
            Quantity.Displacement or Quantity.Velocity or Quantity.Acceleration => (rotates ? 0 : 1, 0),
            Quantity.Force => (rotates ? 1 : 0, 1),
            Quantity.Pressure => (-2, 1),
            Quantity.VolumeVelocity => (3, 0),
            _ => (0, 0),
        };
    }
}
