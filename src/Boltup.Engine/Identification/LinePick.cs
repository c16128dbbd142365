using Boltup.Engine.Spectra;

namespace Boltup.Engine.Identification;

/// <summary>Takes the lines of an axis out of spectra that have them.</summary>
public static class LinePick
{
    /// <param name="axis">Lines that the spectra have, within the tolerance of text.</param>
    public static SpectrumSet On(SpectrumSet set, FrequencyAxis axis)
    {
        if (set.Axis.Matches(axis))
        {
            return set with { Axis = axis };
        }

        int[] lines = [.. axis.Hz.ToArray().Select(set.Axis.IndexOf)];
        return new SpectrumSet(axis, set.Dofs, [.. set.Values.Select(values => lines.Select(line => values[line]).ToArray())]);
    }
}
