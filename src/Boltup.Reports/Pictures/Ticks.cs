using System.Globalization;

namespace Boltup.Reports.Pictures;

/// <summary>Ticks of axes.</summary>
internal static class Ticks
{
    /// <summary>Fewer labels than these do not make a scale.</summary>
    private const int FewestLabels = 3;

    /// <summary>
    /// 1-2-5 ticks with plain numbers (20, 500, 2k) and minor ticks at the other digits; on an axis so short that it has fewer
    /// than three of them, even ticks.
    /// </summary>
    public static IReadOnlyList<AxisTick> OfFrequency(double fromHz, double toHz)
    {
        IReadOnlyList<AxisTick> ticks = OneTwoFive(fromHz, toHz);
        return ticks.Count(tick => tick.IsMajor) >= FewestLabels ? ticks : Even(fromHz, toHz, 6);
    }

    /// <summary>Even ticks with a step of 1, 2 or 5 times a power of ten, about as many as wanted.</summary>
    public static IReadOnlyList<AxisTick> Even(double from, double to, int wanted)
    {
        double rough = (to - from) / wanted;
        double power = Math.Pow(10, Math.Floor(Math.Log10(rough)));
        double step = power * (rough / power) switch
        {
            <= 1 => 1,
            <= 2 => 2,
            <= 5 => 5,
            _ => 10,
        };
        var ticks = new List<AxisTick>();
        for (double at = Math.Ceiling(from / step) * step; at <= to + step * 1e-9; at += step)
        {
            ticks.Add(new AxisTick(at, (Math.Round(at, 10) + 0.0).ToString("G6", CultureInfo.InvariantCulture).Replace('-', '−')));
        }

        return ticks;
    }

    private static List<AxisTick> OneTwoFive(double fromHz, double toHz)
    {
        var ticks = new List<AxisTick>();
        for (double decade = Math.Pow(10, Math.Floor(Math.Log10(fromHz))); decade <= toHz; decade *= 10)
        {
            for (int digit = 1; digit <= 9; digit++)
            {
                double hz = digit * decade;
                if (hz >= fromHz * 0.999 && hz <= toHz * 1.001)
                {
                    ticks.Add(new AxisTick(hz, digit is 1 or 2 or 5 ? Plain(hz) : ""));
                }
            }
        }

        return ticks;
    }

    private static string Plain(double hz) => hz >= 1000
        ? (hz / 1000).ToString("G4", CultureInfo.InvariantCulture) + "k"
        : hz.ToString("G4", CultureInfo.InvariantCulture);
}
