using System.Numerics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Mounts;

/// <summary>
/// Puts two-ports one behind the other: assembles both over first end, last end and the point between, and eliminates the latter, which
/// carries no force from outside (dynamic condensation, common practice).
/// </summary>
internal static class TwoPortChain
{
    private const int LargestOrder = BothEnds.LargestOrder * 3 / 2;

    /// <summary>Replaces a chain by the chain with one more element behind it; both as <see cref="MountLaw.FillStiffness"/> writes them.</summary>
    /// <param name="size">Number of directions.</param>
    public static void Append(Span<double> chain, ReadOnlySpan<double> next, int size)
    {
        Span<Complex> matrix = stackalloc Complex[LargestOrder * LargestOrder];
        int order = 3 * size;
        for (int lane = 0; lane < Tiling.Lanes; lane++)
        {
            Assemble(chain, next, size, lane, matrix[..(order * order)]);
            Eliminate(matrix, order, 2 * size);
            for (int i = 0; i < 4 * size * size; i++)
            {
                Complex k = matrix[i / (2 * size) * order + i % (2 * size)];
                chain[i * Tiling.EntryLength + lane] = k.Real;
                chain[i * Tiling.EntryLength + Tiling.Lanes + lane] = k.Imaginary;
            }
        }
    }

    /// <summary>
    /// Order: first end, last end, between. The displacement between enters the chain with minus, as its second end, and the next element
    /// with plus, as its first.
    /// </summary>
    private static void Assemble(ReadOnlySpan<double> chain, ReadOnlySpan<double> next, int size, int lane, Span<Complex> matrix)
    {
        int order = 3 * size;
        matrix.Clear();
        for (int row = 0; row < 2 * size; row++)
        {
            for (int column = 0; column < 2 * size; column++)
            {
                (int chainRow, int chainColumn) = (row < size ? row : row + size, column < size ? column : column + size);
                int sign = (row < size) == (column < size) ? 1 : -1;
                matrix[chainRow * order + chainColumn] += sign * At(chain, row * 2 * size + column, lane);
                (int nextRow, int nextColumn) = (row < size ? row + 2 * size : row, column < size ? column + 2 * size : column);
                matrix[nextRow * order + nextColumn] += At(next, row * 2 * size + column, lane);
            }
        }
    }

    private static Complex At(ReadOnlySpan<double> tile, int entry, int lane) =>
        new(tile[entry * Tiling.EntryLength + lane], tile[entry * Tiling.EntryLength + Tiling.Lanes + lane]);

    /// <summary>Leaves the Schur complement of the last rows in the first ones; pivots come from the rows that go.</summary>
    private static void Eliminate(Span<Complex> matrix, int order, int kept)
    {
        for (int last = order - 1; last >= kept; last--)
        {
            SwapRows(matrix, order, PivotOf(matrix, order, kept, last), last);
            for (int row = 0; row < last; row++)
            {
                Complex factor = matrix[row * order + last] / matrix[last * order + last];
                for (int column = 0; column < last; column++)
                {
                    matrix[row * order + column] -= factor * matrix[last * order + column];
                }
            }
        }
    }

    private static int PivotOf(ReadOnlySpan<Complex> matrix, int order, int kept, int last)
    {
        int best = last;
        for (int row = kept; row < last; row++)
        {
            if (Complex.Abs(matrix[row * order + last]) > Complex.Abs(matrix[best * order + last]))
            {
                best = row;
            }
        }

        return best;
    }

    private static void SwapRows(Span<Complex> matrix, int order, int first, int second)
    {
        for (int column = 0; first != second && column < order; column++)
        {
            (matrix[first * order + column], matrix[second * order + column]) =
                (matrix[second * order + column], matrix[first * order + column]);
        }
    }
}
