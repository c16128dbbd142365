namespace Boltup.Config.Units;

/// <summary>A unit of the table. A number in it is <c>number × Multiplier / Divisor + Offset</c> in SI units.</summary>
/// <param name="Symbol">The symbol in its full form, such as <c>N·s/m</c>.</param>
/// <param name="Divisor">Kept apart from the multiplier so that 92 mm is exactly the double 0.092.</param>
public sealed record Unit(string Symbol, Dimension Dimension, double Multiplier = 1, double Divisor = 1, double Offset = 0)
{
    public double ToSi(double number) => number * Multiplier / Divisor + Offset;
}
