using System.Globalization;

namespace Boltup.Reports.Pictures;

/// <summary>Ticks of axes.</summary>
internal static class Ticks
{
    /// <summary>Fewer labels than this do not let a reader place a line.</summary>
    private const int FewestLabels = 3;

    /// <summary>
    /// 1-2-5 ticks with plain numbers (20, 500, 2k) and minor ticks at the other digits. A band too narrow for them gets a label at
    /// every digit, or even steps.
    /// </summary>
    public static IReadOnlyList<AxisTick> OfFrequency(double fromHz, double toHz)
    {
        List<AxisTick> ticks = OfDigits(fromHz, toHz);
        if (ticks.Count(tick => tick.IsMajor) >= FewestLabels)
        {
            return ticks;
        }

        return ticks.Count > FewestLabels
            ? [.. ticks.Select(tick => new AxisTick(tick.At, Plain(tick.At)))]
            : [.. Even(fromHz, toHz, 5).Select(tick => new AxisTick(tick.At, Plain(tick.At)))];
    }

    private static List<AxisTick> OfDigits(double fromHz, double toHz)
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

    private static string Plain(double hz) => hz >= 1000
        ? (hz / 1000).ToString("G9", CultureInfo.InvariantCulture) + "k"
        : hz.ToString("G9", CultureInfo.InvariantCulture);
}
