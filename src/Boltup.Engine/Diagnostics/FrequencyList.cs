using System.Globalization;

namespace Boltup.Engine.Diagnostics;

/// <summary>Names frequencies in a message: all of a few, the first few of many.</summary>
public static class FrequencyList
{
    private const int Shown = 5;

    /// <summary>Text such as <c>20, 25 and 30 Hz</c> or <c>20, 25, 30, 35, 40 and 12 more lines up to 900 Hz</c>.</summary>
    /// <param name="hz">At least one frequency in Hz, increasing.</param>
    public static string Of(IReadOnlyList<double> hz)
    {
        string[] first = [.. hz.Take(Shown).Select(value => value.ToString("G6", CultureInfo.InvariantCulture))];
        if (hz.Count > Shown)
        {
            return string.Create(
                CultureInfo.InvariantCulture, $"{string.Join(", ", first)} Hz and {hz.Count - Shown} more lines up to {hz[^1]:G6} Hz");
        }

        return first.Length == 1 ? $"{first[0]} Hz" : $"{string.Join(", ", first[..^1])} and {first[^1]} Hz";
    }
}
