using System.Runtime.CompilerServices;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Kernels;

/// <summary>
/// LU with partial pivoting per lane, left-looking in panels (Golub, Van Loan, Matrix Computations, section 3.2), on 8 matrices at once.
/// </summary>
/// <remarks>
/// Layout: the tile is copied into rows of odd stride, so that a column does not fall into one cache set; rows are exchanged by pointers.
/// Lanes: each lane pivots for itself. Where all lanes agree, or one row is within a factor of two of the best in every lane, row pointers
/// are swapped (element growth stays bounded, at most threefold a step); otherwise rows are blended under masks. A matrix in a lane never
/// touches another lane, so NaN stays where it is. Remainders: odd orders are padded by a unit row and column. Hazard: the reciprocal of a
/// pivot is scaled by its larger part (Smith 1962), so that it neither overflows nor underflows early.
/// </remarks>
[SkipLocalsInit]
internal sealed unsafe partial class VectorLu<T> : LuKernel
    where T : unmanaged, ILanes<T>
{
    private const int Entry = Tiling.EntryLength;
    private const int Imaginary = Tiling.Lanes;
    private const int PanelWidth = 8;
    private const int ChunkColumns = 12;
    private const int ChunkStride = (ChunkColumns + 1) * Entry;

    private static readonly uint AllLanes = (1u << T.Count) - 1;

    private readonly TileBuffer _matrix;
    private readonly TileBuffer _inverseDiagonal;
    private readonly TileBuffer _chunk;
    private readonly long[][] _rows;
    private readonly long[] _chunkRows;
    private readonly List<RowSwap>[] _swaps;
    private int _order;
    private int _evenOrder;

    public VectorLu(int maxOrder)
    {
        int even = maxOrder + (maxOrder & 1);
        int groups = Tiling.Lanes / T.Count;
        _matrix = new TileBuffer(even * StrideOf(even));
        _inverseDiagonal = new TileBuffer(even * Entry);
        _chunk = new TileBuffer(even * ChunkStride);
        _rows = [.. Enumerable.Range(0, groups).Select(_ => new long[even])];
        _chunkRows = new long[even];
        _swaps = [.. Enumerable.Range(0, groups).Select(_ => new List<RowSwap>(2 * even))];
    }

    public override void Factor(double* tile, int order)
    {
        _order = order;
        _evenOrder = order + (order & 1);
        SingularLanes = 0;
        fixed (double* matrix = _matrix.Span)
        {
            CopyIn(tile, matrix);
            for (int group = 0; group < _rows.Length; group++)
            {
                fixed (long* rows = _rows[group])
                fixed (double* inverse = _inverseDiagonal.Span)
                {
                    FactorGroup(group, matrix + group * T.Count, rows, inverse + group * T.Count);
                }
            }
        }
    }

    private static int StrideOf(int even) => (even + 1) * Entry;

    private void CopyIn(double* tile, double* matrix)
    {
        int stride = StrideOf(_evenOrder);
        for (int row = 0; row < _order; row++)
        {
            new ReadOnlySpan<double>(tile + row * _order * Entry, _order * Entry).CopyTo(new Span<double>(matrix + row * stride, _order * Entry));
        }

        if (_order < _evenOrder)
        {
            Pad(matrix, stride);
        }
    }

    private void Pad(double* matrix, int stride)
    {
        double* last = matrix + _order * stride;
        new Span<double>(last, _evenOrder * Entry).Clear();
        new Span<double>(last + _order * Entry, Tiling.Lanes).Fill(1);
        for (int row = 0; row < _order; row++)
        {
            new Span<double>(matrix + row * stride + _order * Entry, Entry).Clear();
        }
    }

    private void FactorGroup(int group, double* a, long* rows, double* inverse)
    {
        _swaps[group].Clear();
        for (int row = 0; row < _evenOrder; row++)
        {
            rows[row] = row * StrideOf(_evenOrder);
        }

        for (int panel = 0; panel < _evenOrder; panel += PanelWidth)
        {
            int end = Math.Min(panel + PanelWidth, _evenOrder);
            ApplyPrevious(a, rows, a, rows, panel, end, 0, panel);
            for (int column = panel; column < end; column += 2)
            {
                ApplyPrevious(a, rows, a, rows, column, column + 2, panel, column);
                Pivot(group, a, rows, column, inverse);
                ScaleAndUpdateNext(a, rows, column, inverse);
                Pivot(group, a, rows, column + 1, inverse);
                Scale(a, rows, column + 1, inverse);
            }
        }
    }

    /// <summary>
    /// Applies the elimination steps first…last−1 to some columns of C (a part of the matrix, or right-hand sides): the rows of these steps
    /// become rows of L⁻¹C, the rows below lose what they must.
    /// </summary>
    private void ApplyPrevious(double* a, long* rows, double* c, long* cRows, int from, int to, int first, int last)
    {
        int row = first;
        while (row < last)
        {
            int height = BlockHeight(last - row);
            SubtractBlock(a, rows, c, cRows, row, height, from, to, first, row - first);
            SolveLowerBlock(a, rows, c, cRows, row, height, from, to);
            row += height;
        }

        while (row < _evenOrder)
        {
            int height = BlockHeight(_evenOrder - row);
            SubtractBlock(a, rows, c, cRows, row, height, from, to, first, last - first);
            row += height;
        }
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static int BlockHeight(int left) => T.HasManyRegisters && left >= 4 ? 4 : 2;

    /// <summary>C[row…, from…to) −= A[row…, k…k+count)·C[k…k+count, from…to).</summary>
    private static void SubtractBlock(
        double* a, long* rows, double* c, long* cRows, int row, int height, int from, int to, int k, int count)
    {
        if (count == 0)
        {
            return;
        }

        double** m = stackalloc double*[4];
        double** target = stackalloc double*[4];
        for (int i = 0; i < height; i++)
        {
            m[i] = a + rows[row + i] + (nint)k * Entry;
            target[i] = c + cRows[row + i] + (nint)from * Entry;
        }

        BlockProduct<T>.Subtract(m, target, height, c + (nint)from * Entry, cRows + k, count, to - from);
    }

    /// <summary>Solves with the unit lower triangle of a diagonal block.</summary>
    private static void SolveLowerBlock(double* a, long* rows, double* c, long* cRows, int row, int height, int from, int to)
    {
        if (height == 4)
        {
            double** m = stackalloc double*[4];
            double** target = stackalloc double*[4];
            PointTo(a, rows, row, row, m);
            for (; from + 2 <= to; from += 2)
            {
                PointTo(c, cRows, row, from, target);
                TriangleKernel<T>.SolveLower(m, target);
            }
        }

        for (int i = 1; i < height; i++)
        {
            SubtractRows(a + rows[row + i] + (nint)row * Entry, c, cRows + row, i, c + cRows[row + i], from, to);
        }
    }

    /// <summary>Points to a column in four rows from one on.</summary>
    private static void PointTo(double* matrix, long* rows, int row, int column, double** pointers)
    {
        for (int i = 0; i < 4; i++)
        {
            pointers[i] = matrix + rows[row + i] + (nint)column * Entry;
        }
    }

    /// <summary>target[from…to) −= Σₖ m[k]·C[k, from…to): a few rows at once, so that the target is loaded and stored once.</summary>
    private static void SubtractRows(double* m, double* c, long* cRows, int count, double* target, int from, int to)
    {
        for (int column = from; column < to; column++)
        {
            double* t = target + (nint)column * Entry;
            T r = T.Load(t), i = T.Load(t + Imaginary);
            for (int k = 0; k < count; k++)
            {
                double* factor = m + (nint)k * Entry;
                double* source = c + cRows[k] + (nint)column * Entry;
                BlockKernel<T>.Subtract(
                    ref r, ref i, T.Load(factor), T.Load(factor + Imaginary), T.Load(source), T.Load(source + Imaginary));
            }

            BlockKernel<T>.Store(t, r, i);
        }
    }

    /// <summary>target[from…to) −= factor·source[from…to).</summary>
    private static void SubtractRow(double* factor, double* source, double* target, int from, int to)
    {
        T fr = T.Load(factor), fi = T.Load(factor + Imaginary);
        for (int column = from; column < to; column++)
        {
            double* s = source + (nint)column * Entry;
            double* t = target + (nint)column * Entry;
            T r = T.Load(t), i = T.Load(t + Imaginary);
            BlockKernel<T>.Subtract(ref r, ref i, fr, fi, T.Load(s), T.Load(s + Imaginary));
            BlockKernel<T>.Store(t, r, i);
        }
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static (T Real, T Imaginary) Times(T ar, T ai, T br, T bi) =>
        (T.MultiplySubtract(ai, bi, ar * br), T.MultiplyAdd(ar, bi, ai * br));

    /// <summary>Turns the column below its pivot into a column of L.</summary>
    private void Scale(double* a, long* rows, int column, double* inverse)
    {
        T pr = T.Load(inverse + (nint)column * Entry), pi = T.Load(inverse + (nint)column * Entry + Imaginary);
        for (int row = column + 1; row < _evenOrder; row++)
        {
            double* entry = a + rows[row] + (nint)column * Entry;
            (T r, T i) = Times(T.Load(entry), T.Load(entry + Imaginary), pr, pi);
            BlockKernel<T>.Store(entry, r, i);
        }
    }

    /// <summary>As <see cref="Scale"/>, and eliminates the column from the one to its right.</summary>
    private void ScaleAndUpdateNext(double* a, long* rows, int column, double* inverse)
    {
        T pr = T.Load(inverse + (nint)column * Entry), pi = T.Load(inverse + (nint)column * Entry + Imaginary);
        double* upper = a + rows[column] + (nint)(column + 1) * Entry;
        T ur = T.Load(upper), ui = T.Load(upper + Imaginary);
        for (int row = column + 1; row < _evenOrder; row++)
        {
            double* entry = a + rows[row] + (nint)column * Entry;
            (T lr, T li) = Times(T.Load(entry), T.Load(entry + Imaginary), pr, pi);
            BlockKernel<T>.Store(entry, lr, li);
            T r = T.Load(entry + Entry), i = T.Load(entry + Entry + Imaginary);
            BlockKernel<T>.Subtract(ref r, ref i, lr, li, ur, ui);
            BlockKernel<T>.Store(entry + Entry, r, i);
        }
    }
}
