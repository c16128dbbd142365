using Boltup.Engine.Spectra;

namespace Boltup.Engine.Parts;

/// <summary>
/// Takes a spectrum from one axis to another: lines that agree are copied, others are interpolated linearly in real and imaginary
/// parts (common practice: magnitude and wrapped phase do not interpolate). Nothing is extrapolated.
/// </summary>
public sealed class AxisMap
{
    private readonly int[] _below;
    private readonly double[] _share;

    private AxisMap(int[] below, double[] share) => (_below, _share) = (below, share);

    /// <summary>Number of target lines that had to be interpolated.</summary>
    public int Interpolated => _share.Count(share => share > 0);

    /// <summary>The map from one axis to another, or null when a target line lies outside the band of the source.</summary>
    public static AxisMap? Between(FrequencyAxis source, FrequencyAxis target)
    {
        var below = new int[target.Count];
        var share = new double[target.Count];
        for (int line = 0; line < target.Count; line++)
        {
            double hz = target[line];
            int same = source.IndexOf(hz);
            if (same >= 0)
            {
                below[line] = same;
                continue;
            }

            int next = ~source.Hz.BinarySearch(hz);
            if (next <= 0 || next >= source.Count)
            {
                return null;
            }

            below[line] = next - 1;
            share[line] = (hz - source[next - 1]) / (source[next] - source[next - 1]);
        }

        return new AxisMap(below, share);
    }

    /// <summary>Maps a spectrum.</summary>
    /// <param name="source">Real and imaginary part of each line of the source axis in turn.</param>
    /// <param name="target">Receives the same for the target axis.</param>
    public void Apply(ReadOnlySpan<double> source, Span<double> target)
    {
        for (int line = 0; line < _below.Length; line++)
        {
            int below = 2 * _below[line];
            double share = _share[line];
            target[2 * line] = share == 0 ? source[below] : (1 - share) * source[below] + share * source[below + 2];
            target[2 * line + 1] = share == 0 ? source[below + 1] : (1 - share) * source[below + 1] + share * source[below + 3];
        }
    }
}
