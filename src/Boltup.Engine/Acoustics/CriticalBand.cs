namespace Boltup.Engine.Acoustics;

/// <summary>A critical band of hearing (ECMA-418-1, from memory; the width at 1 kHz is checked).</summary>
public readonly record struct CriticalBand(double LowerHz, double UpperHz)
{
    /// <summary>Above it a band lies geometrically around its centre, below it arithmetically.</summary>
    private const double GeometricFromHz = 500;

    private const int BisectionSteps = 60;

    public double WidthHz => UpperHz - LowerHz;

    /// <summary>Δf = 25 + 75·(1 + 1.4·(f/1000)²)^0.69.</summary>
    public static double WidthAt(double hz) => 25 + 75 * Math.Pow(1 + 1.4 * hz * hz / 1e6, 0.69);

    /// <summary>The band around a frequency.</summary>
    public static CriticalBand Around(double hz)
    {
        double width = WidthAt(hz);
        double lower = hz < GeometricFromHz ? hz - width / 2 : (Math.Sqrt(width * width + 4 * hz * hz) - width) / 2;
        return new CriticalBand(lower, lower + width);
    }

    /// <summary>The band that ends where this one begins, cut at a lowest frequency.</summary>
    public CriticalBand Below(double lowestHz)
    {
        double upper = LowerHz;
        double centre = Bisect(0, upper, hz => Around(hz).UpperHz < upper);
        return new CriticalBand(Math.Max(lowestHz, Around(centre).LowerHz), upper);
    }

    /// <summary>The band that begins where this one ends.</summary>
    public CriticalBand Above()
    {
        double lower = UpperHz;
        double centre = Bisect(lower, 4 * lower, hz => Around(hz).LowerHz < lower);
        return new CriticalBand(lower, lower + WidthAt(centre));
    }

    /// <summary>Where a monotone condition stops to hold.</summary>
    private static double Bisect(double from, double to, Predicate<double> holds)
    {
        for (int i = 0; i < BisectionSteps; i++)
        {
            double middle = (from + to) / 2;
            (from, to) = holds(middle) ? (middle, to) : (from, middle);
        }

        return (from + to) / 2;
    }
}
