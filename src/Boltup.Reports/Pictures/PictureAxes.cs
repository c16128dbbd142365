using Boltup.Engine.Acoustics;
using Boltup.Engine.Spectra;
using Boltup.Reports.Results;

namespace Boltup.Reports.Pictures;

/// <summary>The axes that pictures share.</summary>
internal static class PictureAxes
{
    /// <summary>Logarithmic, with plain numbers.</summary>
    public static PictureAxis Frequency(FrequencyAxis axis, string label)
    {
        // A single line stands in the middle of an octave.
        double margin = axis.Hz[^1] > LowestHz(axis) ? 1 : Math.Sqrt(2);
        double from = LowestHz(axis) / margin;
        double to = Math.Max(axis.LastHz, LowestHz(axis)) * margin;
        return new PictureAxis(label, from, to, true, Ticks.OfFrequency(from, to));
    }

    /// <summary>The lowest line that a logarithmic axis can show.</summary>
    private static double LowestHz(FrequencyAxis axis) => axis.FirstHz > 0 ? axis.FirstHz : axis.Count > 1 ? axis[1] : 1;

    /// <summary>A level, with limits that one deep notch does not rule.</summary>
    public static PictureAxis Level(IEnumerable<IReadOnlyList<double>> lines, LevelReference reference, int ticks)
    {
        (double from, double to) = LevelLimits.Of(lines.SelectMany(line => line));
        return new PictureAxis($"Level in dB re {reference.Text}", from, to, false, Ticks.Even(from, to, ticks));
    }
}
