using System.Diagnostics;

namespace Boltup.Benchmarks.Kernels;

/// <summary>The shortest of several runs: what the work costs when nothing else disturbs it.</summary>
internal static class Shortest
{
    /// <summary>Seconds.</summary>
    public static double Of(Action action)
    {
        action();
        double best = double.PositiveInfinity;
        long end = Stopwatch.GetTimestamp() + Stopwatch.Frequency / 3;
        while (Stopwatch.GetTimestamp() < end)
        {
            long start = Stopwatch.GetTimestamp();
            action();
            best = Math.Min(best, Stopwatch.GetElapsedTime(start).TotalSeconds);
        }

        return best;
    }
}
