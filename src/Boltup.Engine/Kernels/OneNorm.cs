using Boltup.Engine.Spectra;

namespace Boltup.Engine.Kernels;

/// <summary>The 1-norm of the matrices of a tile: the largest sum of moduli of a column.</summary>
internal static class OneNorm
{
    public static void Of(ReadOnlySpan<double> tile, int order, Span<double> lanes)
    {
        lanes.Clear();
        Span<double> sum = stackalloc double[Tiling.Lanes];
        for (int column = 0; column < order; column++)
        {
            sum.Clear();
            for (int row = 0; row < order; row++)
            {
                AddModuli(tile.Slice((row * order + column) * Tiling.EntryLength, Tiling.EntryLength), sum);
            }

            for (int lane = 0; lane < Tiling.Lanes; lane++)
            {
                lanes[lane] = Math.Max(lanes[lane], sum[lane]);
            }
        }
    }

    /// <summary>Adds the moduli of an entry to the sums of the lanes.</summary>
    public static void AddModuli(ReadOnlySpan<double> entry, Span<double> lanes)
    {
        for (int lane = 0; lane < Tiling.Lanes; lane++)
        {
            double imaginary = entry[Tiling.Lanes + lane];
            lanes[lane] += Math.Sqrt(entry[lane] * entry[lane] + imaginary * imaginary);
        }
    }
}
