namespace Boltup.Engine.Kernels;

/// <summary>Runs the block kernels over all columns of a block of rows.</summary>
internal static unsafe class BlockProduct<T>
    where T : unmanaged, ILanes<T>
{
    private const int Entry = Spectra.Tiling.EntryLength;

    /// <summary>C −= M·X for 4, 2 or 1 rows and any number of columns.</summary>
    /// <param name="m">Pointers to the rows of M at the first k.</param>
    /// <param name="c">Pointers to the rows of C at the first column; moved on by the call.</param>
    /// <param name="x">Base of X at the first column.</param>
    /// <param name="offsets">Offsets of the rows of X from the first k on.</param>
    public static void Subtract(double** m, double** c, int height, double* x, long* offsets, int count, int columns)
    {
        int column = 0;
        for (; column + 2 <= columns && height >= 2; column += 2, x += 2 * Entry)
        {
            if (height == 4)
            {
                BlockKernel<T>.Subtract4x2(m, c, x, offsets, count);
            }
            else
            {
                BlockKernel<T>.Subtract2x2(m, c, x, offsets, count);
            }

            MoveOn(c, height, 2 * Entry);
        }

        for (; column < columns; column++, x += Entry)
        {
            SubtractColumn(m, c, height, x, offsets, count);
            MoveOn(c, height, Entry);
        }
    }

    private static void SubtractColumn(double** m, double** c, int height, double* x, long* offsets, int count)
    {
        if (height == 4)
        {
            BlockKernel<T>.Subtract4x1(m, c, x, offsets, count);
            return;
        }

        for (int i = 0; i < height; i++)
        {
            BlockKernel<T>.Subtract1x1(m[i], c[i], x, offsets, count);
        }
    }

    private static void MoveOn(double** c, int height, int by)
    {
        for (int i = 0; i < height; i++)
        {
            c[i] += by;
        }
    }
}
