using System.Globalization;
using Boltup.Config.Units;
using UnitsNet;
using QuantityParser = Boltup.Config.Units.QuantityParser;

namespace Boltup.Tests.Config.Units;

/// <summary>The table of units against the independent library UnitsNet 5.75 (and by definition where it lacks the unit).</summary>
public class UnitsNetTests
{
    /// <summary>Two roundings in each of the two conversions: 4 × 2⁻⁵³ = 4.4e-16, with a margin of two.</summary>
    private const double Tolerance = 1e-15;

    private const double Number = 7.25;

    private static readonly Dictionary<string, double> Expected = new()
    {
        ["m"] = Length.FromMeters(Number).Meters,
        ["cm"] = Length.FromCentimeters(Number).Meters,
        ["mm"] = Length.FromMillimeters(Number).Meters,
        ["µm"] = Length.FromMicrometers(Number).Meters,
        ["kg"] = Mass.FromKilograms(Number).Kilograms,
        ["g"] = Mass.FromGrams(Number).Kilograms,
        ["t"] = Mass.FromTonnes(Number).Kilograms,
        ["s"] = Duration.FromSeconds(Number).Seconds,
        ["ms"] = Duration.FromMilliseconds(Number).Seconds,
        ["µs"] = Duration.FromMicroseconds(Number).Seconds,
        ["min"] = Duration.FromMinutes(Number).Seconds,
        ["Hz"] = Frequency.FromHertz(Number).Hertz,
        ["kHz"] = Frequency.FromKilohertz(Number).Hertz,
        ["rad/s"] = RotationalSpeed.FromRadiansPerSecond(Number).RadiansPerSecond,
        ["rad"] = Angle.FromRadians(Number).Radians,
        ["mrad"] = Angle.FromMilliradians(Number).Radians,
        ["deg"] = Angle.FromDegrees(Number).Radians,
        ["N"] = Force.FromNewtons(Number).Newtons,
        ["mN"] = Force.FromMillinewtons(Number).Newtons,
        ["µN"] = Force.FromMicronewtons(Number).Newtons,
        ["kN"] = Force.FromKilonewtons(Number).Newtons,
        ["MN"] = Force.FromMeganewtons(Number).Newtons,
        ["N·m"] = Torque.FromNewtonMeters(Number).NewtonMeters,
        ["N·mm"] = Torque.FromNewtonMillimeters(Number).NewtonMeters,
        ["mN·m"] = Torque.FromNewtonMillimeters(Number).NewtonMeters,
        ["kN·m"] = Torque.FromKilonewtonMeters(Number).NewtonMeters,
        ["N/m"] = ForcePerLength.FromNewtonsPerMeter(Number).NewtonsPerMeter,
        ["N/mm"] = ForcePerLength.FromNewtonsPerMillimeter(Number).NewtonsPerMeter,
        ["N/µm"] = ForcePerLength.FromMeganewtonsPerMeter(Number).NewtonsPerMeter,
        ["kN/m"] = ForcePerLength.FromKilonewtonsPerMeter(Number).NewtonsPerMeter,
        ["kN/mm"] = ForcePerLength.FromKilonewtonsPerMillimeter(Number).NewtonsPerMeter,
        ["MN/m"] = ForcePerLength.FromMeganewtonsPerMeter(Number).NewtonsPerMeter,
        ["N·m/rad"] = RotationalStiffness.FromNewtonMetersPerRadian(Number).NewtonMetersPerRadian,
        ["N·mm/rad"] = RotationalStiffness.FromNewtonMillimetersPerRadian(Number).NewtonMetersPerRadian,
        ["kN·m/rad"] = RotationalStiffness.FromKilonewtonMetersPerRadian(Number).NewtonMetersPerRadian,
        ["MN·m/rad"] = RotationalStiffness.FromMeganewtonMetersPerRadian(Number).NewtonMetersPerRadian,
        ["N·m/deg"] = RotationalStiffness.FromNewtonMetersPerDegree(Number).NewtonMetersPerRadian,
        ["kg·m²"] = MassMomentOfInertia.FromKilogramSquareMeters(Number).KilogramSquareMeters,
        ["kg·cm²"] = MassMomentOfInertia.FromKilogramSquareCentimeters(Number).KilogramSquareMeters,
        ["kg·mm²"] = MassMomentOfInertia.FromKilogramSquareMillimeters(Number).KilogramSquareMeters,
        ["g·m²"] = MassMomentOfInertia.FromGramSquareMeters(Number).KilogramSquareMeters,
        ["Pa"] = Pressure.FromPascals(Number).Pascals,
        ["mPa"] = Pressure.FromMillipascals(Number).Pascals,
        ["µPa"] = Pressure.FromMicropascals(Number).Pascals,
        ["kPa"] = Pressure.FromKilopascals(Number).Pascals,
        ["MPa"] = Pressure.FromMegapascals(Number).Pascals,
        ["GPa"] = Pressure.FromGigapascals(Number).Pascals,
        ["m/s"] = Speed.FromMetersPerSecond(Number).MetersPerSecond,
        ["mm/s"] = Speed.FromMillimetersPerSecond(Number).MetersPerSecond,
        ["µm/s"] = Speed.FromMicrometersPerSecond(Number).MetersPerSecond,
        ["km/h"] = Speed.FromKilometersPerHour(Number).MetersPerSecond,
        ["m/s²"] = Acceleration.FromMetersPerSecondSquared(Number).MetersPerSecondSquared,
        ["mm/s²"] = Acceleration.FromMillimetersPerSecondSquared(Number).MetersPerSecondSquared,
        ["µm/s²"] = Acceleration.FromMicrometersPerSecondSquared(Number).MetersPerSecondSquared,
        ["g_n"] = Acceleration.FromStandardGravity(Number).MetersPerSecondSquared,
        ["m³/s"] = VolumeFlow.FromCubicMetersPerSecond(Number).CubicMetersPerSecond,
        ["kg/m³"] = Density.FromKilogramsPerCubicMeter(Number).KilogramsPerCubicMeter,
        ["g/cm³"] = Density.FromGramsPerCubicCentimeter(Number).KilogramsPerCubicMeter,
        ["dB"] = Level.FromDecibels(Number).Decibels,
        ["K"] = Temperature.FromKelvins(Number).Kelvins,
        ["degC"] = Temperature.FromDegreesCelsius(Number).Kelvins,

        // by definition: UnitsNet has no force per angle and no viscous damping, and its rpm is rounded to 12 digits
        ["rpm"] = Number * Math.Tau / 60,
        ["N/rad"] = Number,
        ["kN/rad"] = Number * 1e3,
        ["N·m/m"] = Number,
        ["N·mm/mm"] = Number,
        ["N·s/m"] = Number,
        ["N·s/mm"] = Number * 1e3,
        ["kN·s/m"] = Number * 1e3,
        ["N·m·s/rad"] = Number,
        ["kN·m·s/rad"] = Number * 1e3,
    };

    public static TheoryData<string> Symbols => [.. UnitTable.All.Select(unit => unit.Symbol)];

    [Theory]
    [MemberData(nameof(Symbols))]
    public void ToSi_EveryUnit_EqualsUnitsNet(string symbol)
    {
        double si = UnitTable.Find(symbol)!.ToSi(Number);
        Assert.InRange(Math.Abs(si / Expected[symbol] - 1), 0, Tolerance);
    }

    [Theory]
    [MemberData(nameof(Symbols))]
    public void Parse_EveryUnit_HasTheUnitOfItsDimension(string symbol)
    {
        Unit unit = UnitTable.Find(symbol)!;
        Unit si = UnitTable.Find(unit.Dimension.SiUnit)!;
        Unit customary = UnitTable.Find(unit.Dimension.CustomaryUnit)!;
        Assert.Equal((unit.Dimension, unit.Dimension), (si.Dimension, customary.Dimension));
        Assert.Equal(Number, si.ToSi(Number));
        string text = string.Create(CultureInfo.InvariantCulture, $"{Number} {symbol}");
        Assert.Equal(unit.ToSi(Number), QuantityParser.Parse(text, unit.Dimension).Si);
    }
}
