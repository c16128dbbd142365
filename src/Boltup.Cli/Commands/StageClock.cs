using System.Diagnostics;
using System.Globalization;

namespace Boltup.Cli.Commands;

/// <summary>How long the steps of a run took; the first step is the start of the program.</summary>
internal sealed class StageClock
{
    private readonly List<(string Name, double Milliseconds)> _stages = [];
    private long _last;

    public StageClock()
    {
        double start = (DateTime.UtcNow - Process.GetCurrentProcess().StartTime.ToUniversalTime()).TotalMilliseconds;
        _stages.Add(("start", start));
        _last = Stopwatch.GetTimestamp();
    }

    /// <summary>Ends a step that began with the end of the one before.</summary>
    public void End(string name)
    {
        long now = Stopwatch.GetTimestamp();
        _stages.Add((name, Stopwatch.GetElapsedTime(_last, now).TotalMilliseconds));
        _last = now;
    }

    public void Print(TextWriter output)
    {
        string[] parts = [.. _stages.Select(stage => string.Create(CultureInfo.InvariantCulture, $"{stage.Name} {stage.Milliseconds:F0} ms"))];
        string peak = string.Create(CultureInfo.InvariantCulture, $"peak memory {Process.GetCurrentProcess().PeakWorkingSet64 / 1048576.0:F0} MiB");
        output.WriteLine(string.Join(", ", parts) + ", " + peak);
    }
}
