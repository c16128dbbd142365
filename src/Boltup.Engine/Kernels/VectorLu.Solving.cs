using Boltup.Engine.Spectra;

namespace Boltup.Engine.Kernels;

/// <summary>Solution for right-hand sides, in chunks of columns that stay in the cache.</summary>
internal sealed unsafe partial class VectorLu<T>
{
    public override void Solve(double* tile, int columns) => InChunks(tile, columns, transposed: false);

    public override void SolveTransposed(double* tile, int columns) => InChunks(tile, columns, transposed: true);

    private void InChunks(double* tile, int columns, bool transposed)
    {
        fixed (double* matrix = _matrix.Span, inverse = _inverseDiagonal.Span, chunk = _chunk.Span)
        {
            for (int column = 0; column < columns; column += ChunkColumns)
            {
                int width = Math.Min(ChunkColumns, columns - column);
                CopyChunkIn(tile + (nint)column * Entry, columns, chunk, width);
                for (int group = 0; group < _rows.Length; group++)
                {
                    int lane = group * T.Count;
                    fixed (long* rows = _rows[group], chunkRows = _chunkRows)
                    {
                        ResetRows(chunkRows);
                        if (transposed)
                        {
                            SolveTransposedGroup(group, matrix + lane, rows, inverse + lane, chunk + lane, chunkRows, width);
                        }
                        else
                        {
                            SolveGroup(group, matrix + lane, rows, inverse + lane, chunk + lane, chunkRows, width);
                        }

                        CopyChunkOut(chunk + lane, chunkRows, tile + (nint)column * Entry + lane, columns, width);
                    }
                }
            }
        }
    }

    private void ResetRows(long* chunkRows)
    {
        for (int row = 0; row < _evenOrder; row++)
        {
            chunkRows[row] = (long)row * ChunkStride;
        }
    }

    private void CopyChunkIn(double* tile, int columns, double* chunk, int width)
    {
        for (int row = 0; row < _order; row++)
        {
            new ReadOnlySpan<double>(tile + (nint)row * columns * Entry, width * Entry).CopyTo(new Span<double>(chunk + (nint)row * ChunkStride, width * Entry));
        }

        if (_order < _evenOrder)
        {
            new Span<double>(chunk + (nint)_order * ChunkStride, width * Entry).Clear();
        }
    }

    private void CopyChunkOut(double* chunk, long* chunkRows, double* tile, int columns, int width)
    {
        for (int row = 0; row < _order; row++)
        {
            double* source = chunk + chunkRows[row];
            double* target = tile + (nint)row * columns * Entry;
            for (int i = 0; i < 2 * width; i++)
            {
                T.Store(T.Load(source + (nint)i * Tiling.Lanes), target + (nint)i * Tiling.Lanes);
            }
        }
    }

    private void SolveGroup(int group, double* a, long* rows, double* inverse, double* c, long* cRows, int width)
    {
        foreach (RowSwap swap in _swaps[group])
        {
            Exchange(c, cRows, swap, width);
        }

        ApplyPrevious(a, rows, c, cRows, 0, width, 0, _evenOrder);
        int row = _evenOrder;
        while (row > 0)
        {
            int height = BlockHeight(row);
            row -= height;
            SubtractBlock(a, rows, c, cRows, row, height, 0, width, row + height, _evenOrder - row - height);
            SolveUpperBlock(a, rows, inverse, c, cRows, row, height, width);
        }
    }

    private static void SolveUpperBlock(
        double* a, long* rows, double* inverse, double* c, long* cRows, int row, int height, int width)
    {
        int column = 0;
        if (height == 4)
        {
            double** m = stackalloc double*[4];
            double** target = stackalloc double*[4];
            PointTo(a, rows, row, row, m);
            for (; column + 2 <= width; column += 2)
            {
                PointTo(c, cRows, row, column, target);
                TriangleKernel<T>.SolveUpper(m, target, inverse + (nint)row * Entry);
            }
        }

        for (int i = height - 1; i >= 0; i--)
        {
            double* beside = a + rows[row + i] + (nint)(row + i + 1) * Entry;
            SubtractRows(beside, c, cRows + row + i + 1, height - 1 - i, c + cRows[row + i], column, width);
            ScaleRow(inverse + (nint)(row + i) * Entry, c + cRows[row + i], column, width);
        }
    }

    private static void ScaleRow(double* factor, double* row, int from, int to)
    {
        T fr = T.Load(factor), fi = T.Load(factor + Imaginary);
        for (int column = from; column < to; column++)
        {
            double* entry = row + (nint)column * Entry;
            (T r, T i) = Times(T.Load(entry), T.Load(entry + Imaginary), fr, fi);
            BlockKernel<T>.Store(entry, r, i);
        }
    }

    /// <summary>Aᵀ = Uᵀ Lᵀ P: both triangles row by row, then the exchanges backwards.</summary>
    private void SolveTransposedGroup(int group, double* a, long* rows, double* inverse, double* c, long* cRows, int width)
    {
        for (int k = 0; k < _evenOrder; k++)
        {
            ScaleRow(inverse + (nint)k * Entry, c + cRows[k], 0, width);
            for (int i = k + 1; i < _evenOrder; i++)
            {
                SubtractRow(a + rows[k] + (nint)i * Entry, c + cRows[k], c + cRows[i], 0, width);
            }
        }

        for (int k = _evenOrder - 1; k > 0; k--)
        {
            for (int i = 0; i < k; i++)
            {
                SubtractRow(a + rows[k] + (nint)i * Entry, c + cRows[k], c + cRows[i], 0, width);
            }
        }

        for (int i = _swaps[group].Count - 1; i >= 0; i--)
        {
            Exchange(c, cRows, _swaps[group][i], width);
        }
    }
}
