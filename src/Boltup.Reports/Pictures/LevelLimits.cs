namespace Boltup.Reports.Pictures;

/// <summary>Limits of a level axis that one deep notch does not rule.</summary>
internal static class LevelLimits
{
    /// <summary>Share of the lines that may fall below the picture.</summary>
    private const double HiddenShare = 0.02;

    /// <summary>Room above the strongest line for its words, in dB.</summary>
    private const double Headroom = 6;

    private const double Step = 10;
    private const double LargestRange = 120;
    private const double SmallestRange = 30;

    /// <summary>Limits in dB, at multiples of ten.</summary>
    public static (double From, double To) Of(IEnumerable<double> decibels)
    {
        double[] sorted = [.. decibels.Where(double.IsFinite).Order()];
        if (sorted.Length == 0)
        {
            return (0, SmallestRange);
        }

        double to = Step * Math.Ceiling((sorted[^1] + Headroom) / Step);
        double from = Step * Math.Floor((sorted[(int)(HiddenShare * sorted.Length)] - 2) / Step);
        return (Math.Clamp(from, to - LargestRange, to - SmallestRange), to);
    }
}
