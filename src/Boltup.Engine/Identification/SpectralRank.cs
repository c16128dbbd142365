using Boltup.Engine.Kernels;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Identification;

/// <summary>How many independent mechanisms a matrix of cross-spectra holds.</summary>
public static class SpectralRank
{
    /// <summary>Share of the strongest component's amplitude from which another one counts: −60 dB of power.</summary>
    public const double LeastShare = 1e-3;

    /// <summary>The rank of Σ f·fᴴ over the columns at each line: components above <see cref="LeastShare"/> of the strongest.</summary>
    public static int[] Of(IReadOnlyList<SpectrumSet> columns)
    {
        (FrequencyAxis axis, int dofs) = (columns[0].Axis, columns[0].Dofs.Count);
        bool tall = columns.Count >= dofs;
        var matrix = tall ? new TiledMatrix(axis.Count, columns.Count, dofs) : new TiledMatrix(axis.Count, dofs, columns.Count);
        for (int i = 0; i < columns.Count * dofs; i++)
        {
            (int column, int dof) = Math.DivRem(i, dofs);
            // Singular values are those of the transpose too, so the phases may stay as they are.
            matrix.ScatterSpectrum(tall ? column : dof, tall ? dof : column, columns[column].Values[dof]);
        }

        return Count(matrix);
    }

    private static int[] Count(TiledMatrix matrix)
    {
        var svd = new BatchSvd(matrix.Rows, matrix.Columns);
        int[] ranks = new int[matrix.Lines];
        for (int line = 0; line < ranks.Length; line++)
        {
            (int tile, int lane) = Math.DivRem(line, Tiling.Lanes);
            if (lane == 0)
            {
                svd.Factor(matrix.Tile(tile), matrix.Rows, matrix.Columns);
            }

            ranks[line] = CountAt(svd.SingularValues, lane);
        }

        return ranks;
    }

    private static int CountAt(ReadOnlySpan<double> values, int lane)
    {
        double largest = 0;
        for (int i = lane; i < values.Length; i += Tiling.Lanes)
        {
            largest = Math.Max(largest, values[i]);
        }

        int count = 0;
        for (int i = lane; i < values.Length; i += Tiling.Lanes)
        {
            count += values[i] > LeastShare * largest ? 1 : 0;
        }

        return count;
    }
}
