namespace Boltup.Config.Units;

/// <summary>
/// The units that documents may use. Factors are exact by definition (SI Brochure, 9th edition; the standard
/// acceleration 9.80665 m/s² is that of the 3rd CGPM, 1901).
/// </summary>
public static class UnitTable
{
    private static readonly Unit[] Units =
    [
        new("m", Dimension.Length), new("cm", Dimension.Length, Divisor: 100), new("mm", Dimension.Length, Divisor: 1e3),
        new("µm", Dimension.Length, Divisor: 1e6),
        new("kg", Dimension.Mass), new("g", Dimension.Mass, Divisor: 1e3), new("t", Dimension.Mass, 1e3),
        new("s", Dimension.Time), new("ms", Dimension.Time, Divisor: 1e3), new("µs", Dimension.Time, Divisor: 1e6),
        new("min", Dimension.Time, 60),
        new("Hz", Dimension.Frequency), new("kHz", Dimension.Frequency, 1e3),
        new("rad/s", Dimension.RotationalSpeed), new("rpm", Dimension.RotationalSpeed, 2 * Math.PI, 60),
        new("rad", Dimension.Angle), new("mrad", Dimension.Angle, Divisor: 1e3), new("deg", Dimension.Angle, Math.PI, 180),
        new("N", Dimension.Force), new("mN", Dimension.Force, Divisor: 1e3), new("µN", Dimension.Force, Divisor: 1e6),
        new("kN", Dimension.Force, 1e3), new("MN", Dimension.Force, 1e6),
        new("N·m", Dimension.Moment), new("N·mm", Dimension.Moment, Divisor: 1e3), new("mN·m", Dimension.Moment, Divisor: 1e3),
        new("kN·m", Dimension.Moment, 1e3),
        new("N/m", Dimension.Stiffness), new("N/mm", Dimension.Stiffness, 1e3), new("N/µm", Dimension.Stiffness, 1e6),
        new("kN/m", Dimension.Stiffness, 1e3), new("kN/mm", Dimension.Stiffness, 1e6), new("MN/m", Dimension.Stiffness, 1e6),
        new("N·m/rad", Dimension.RotationalStiffness), new("N·mm/rad", Dimension.RotationalStiffness, Divisor: 1e3),
        new("kN·m/rad", Dimension.RotationalStiffness, 1e3), new("MN·m/rad", Dimension.RotationalStiffness, 1e6),
        new("N·m/deg", Dimension.RotationalStiffness, 180, Math.PI),
        new("N/rad", Dimension.CouplingStiffness), new("kN/rad", Dimension.CouplingStiffness, 1e3),
        new("N·m/m", Dimension.CouplingStiffness), new("N·mm/mm", Dimension.CouplingStiffness),
        new("N·s/m", Dimension.Damping), new("N·s/mm", Dimension.Damping, 1e3), new("kN·s/m", Dimension.Damping, 1e3),
        new("N·m·s/rad", Dimension.RotationalDamping), new("kN·m·s/rad", Dimension.RotationalDamping, 1e3),
        new("kg·m²", Dimension.Inertia), new("kg·cm²", Dimension.Inertia, Divisor: 1e4),
        new("kg·mm²", Dimension.Inertia, Divisor: 1e6),
        new("g·m²", Dimension.Inertia, Divisor: 1e3),
        new("Pa", Dimension.Pressure), new("mPa", Dimension.Pressure, Divisor: 1e3), new("µPa", Dimension.Pressure, Divisor: 1e6),
        new("kPa", Dimension.Pressure, 1e3), new("MPa", Dimension.Pressure, 1e6), new("GPa", Dimension.Pressure, 1e9),
        new("m/s", Dimension.Velocity), new("mm/s", Dimension.Velocity, Divisor: 1e3), new("µm/s", Dimension.Velocity, Divisor: 1e6),
        new("km/h", Dimension.Velocity, 1, 3.6),
        new("m/s²", Dimension.Acceleration), new("mm/s²", Dimension.Acceleration, Divisor: 1e3),
        new("µm/s²", Dimension.Acceleration, Divisor: 1e6), new("g_n", Dimension.Acceleration, 9.80665),
        new("m³/s", Dimension.VolumeVelocity),
        new("kg/m³", Dimension.Density), new("g/cm³", Dimension.Density, 1e3),
        new("dB", Dimension.Level),
        new("K", Dimension.Temperature), new("degC", Dimension.Temperature, Offset: 273.15),
    ];

    private static readonly (string Spelling, string Symbol)[] Spellings =
    [
        ("°", "deg"), ("°C", "degC"), ("Nm", "N·m"), ("Nmm", "N·mm"), ("kNm", "kN·m"), ("mNm", "mN·m"),
        ("Nm/rad", "N·m/rad"), ("Nmm/rad", "N·mm/rad"), ("kNm/rad", "kN·m/rad"), ("MNm/rad", "MN·m/rad"), ("Nm/deg", "N·m/deg"),
        ("N·m/°", "N·m/deg"), ("Ns/m", "N·s/m"), ("Ns/mm", "N·s/mm"), ("kNs/m", "kN·s/m"), ("Nms/rad", "N·m·s/rad"),
        ("kNms/rad", "kN·m·s/rad"), ("N·s·m/rad", "N·m·s/rad"), ("kgm²", "kg·m²"), ("1/min", "rpm"), ("r/min", "rpm"),
    ];

    private static readonly Dictionary<string, Unit> BySymbol = Index();

    /// <summary>Every unit once, under its full symbol.</summary>
    public static IReadOnlyList<Unit> All => Units;

    /// <summary>The unit of a text, where <c>*</c> may stand for the dot, <c>u</c> for <c>µ</c> and <c>^2</c> for <c>²</c>.</summary>
    public static Unit? Find(string text) => BySymbol.GetValueOrDefault(UnitText.Normalize(text));

    /// <summary>The symbols of the units of a dimension, the SI unit first.</summary>
    public static IEnumerable<string> SymbolsOf(Dimension dimension) =>
        Units.Where(unit => unit.Dimension == dimension).Select(unit => unit.Symbol);

    private static Dictionary<string, Unit> Index()
    {
        var index = new Dictionary<string, Unit>(StringComparer.Ordinal);
        foreach (Unit unit in Units)
        {
            index.Add(unit.Symbol, unit);
            if (unit.Symbol.Contains('µ', StringComparison.Ordinal))
            {
                index.Add(unit.Symbol.Replace('µ', 'u'), unit);
            }
        }

        foreach ((string spelling, string symbol) in Spellings)
        {
            index.Add(spelling, index[symbol]);
        }

        return index;
    }
}
