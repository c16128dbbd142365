using System.Globalization;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Evidence;

/// <summary>A run of neighbouring lines that have something in common, from its first to its last line.</summary>
public sealed record LineBand(double FromHz, double ToHz, int Lines)
{
    /// <summary>The runs of lines for which something holds.</summary>
    public static IReadOnlyList<LineBand> Where(FrequencyAxis axis, Func<int, bool> holds)
    {
        var bands = new List<LineBand>();
        int first = -1;
        for (int line = 0; line <= axis.Count; line++)
        {
            bool inside = line < axis.Count && holds(line);
            if (inside && first < 0)
            {
                first = line;
            }
            else if (!inside && first >= 0)
            {
                bands.Add(new LineBand(axis[first], axis[line - 1], line - first));
                first = -1;
            }
        }

        return bands;
    }

    public override string ToString() => Lines == 1
        ? string.Create(CultureInfo.InvariantCulture, $"{FromHz:G6} Hz")
        : string.Create(CultureInfo.InvariantCulture, $"{FromHz:G6} to {ToHz:G6} Hz");
}
