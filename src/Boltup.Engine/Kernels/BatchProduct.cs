using System.Numerics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Kernels;

/// <summary>Products of the complex matrices of a tile, 8 lines at once; lanes never mix.</summary>
public static unsafe class BatchProduct
{
    /// <summary>Inner sizes up to this take their row offsets from the stack.</summary>
    private const int MaxStackOffsets = 512;

    /// <summary>result = A·B.</summary>
    /// <param name="a">rows × inner entries.</param>
    /// <param name="b">inner × columns entries.</param>
    /// <param name="result">rows × columns entries; must not overlap the factors.</param>
    /// <param name="variant">Body of the kernel; by default the one that <see cref="KernelChoice"/> names.</param>
    public static void Multiply(
        ReadOnlySpan<double> a, ReadOnlySpan<double> b, Span<double> result, int rows, int inner, int columns, KernelVariant? variant = null)
    {
        TileSize.Require(a, rows, inner);
        TileSize.Require(b, inner, columns);
        TileSize.Require(result, rows, columns);
        Span<double> product = result[..(rows * columns * Tiling.EntryLength)];
        product.Clear();
        fixed (double* pa = a, pb = b, pc = product)
        {
            SubtractProduct(pa, pb, pc, rows, inner, columns, variant ?? KernelChoice.Current);
        }

        // The one block kernel subtracts; turning the sign of the small result costs less than a second kernel.
        foreach (ref double value in product)
        {
            value = -value;
        }
    }

    private static void SubtractProduct(double* a, double* b, double* c, int rows, int inner, int columns, KernelVariant variant)
    {
        switch (variant)
        {
            case KernelVariant.Vector512:
                Subtract<Lanes512>(a, b, c, rows, inner, columns);
                break;
            case KernelVariant.Vector256:
                Subtract<Lanes256>(a, b, c, rows, inner, columns);
                break;
            case KernelVariant.Vector128:
                Subtract<Lanes128>(a, b, c, rows, inner, columns);
                break;
            default:
                SubtractByLine(a, b, c, rows, inner, columns);
                break;
        }
    }

    private static void Subtract<T>(double* a, double* b, double* c, int rows, int inner, int columns)
        where T : unmanaged, ILanes<T>
    {
        Span<long> offsets = inner <= MaxStackOffsets ? stackalloc long[inner] : new long[inner];
        for (int k = 0; k < inner; k++)
        {
            offsets[k] = (long)k * columns * Tiling.EntryLength;
        }

        double** m = stackalloc double*[4];
        double** target = stackalloc double*[4];
        fixed (long* rowsOfB = offsets)
        {
            for (int lane = 0; lane < Tiling.Lanes; lane += T.Count)
            {
                int height;
                for (int row = 0; row < rows; row += height)
                {
                    int left = rows - row;
                    height = T.HasManyRegisters && left >= 4 ? 4 : Math.Min(left, 2);
                    for (int i = 0; i < height; i++)
                    {
                        m[i] = a + lane + (nint)(row + i) * inner * Tiling.EntryLength;
                        target[i] = c + lane + (nint)(row + i) * columns * Tiling.EntryLength;
                    }

                    BlockProduct<T>.Subtract(m, target, height, b + lane, rowsOfB, inner, columns);
                }
            }
        }
    }

    /// <summary>The reference: one line, one entry at a time.</summary>
    private static void SubtractByLine(double* a, double* b, double* c, int rows, int inner, int columns)
    {
        for (int i = 0; i < rows * columns * Tiling.Lanes; i++)
        {
            int lane = i % Tiling.Lanes;
            int row = i / Tiling.Lanes / columns;
            int column = i / Tiling.Lanes % columns;
            Complex sum = Complex.Zero;
            for (int k = 0; k < inner; k++)
            {
                sum += Read(a, row * inner + k, lane) * Read(b, k * columns + column, lane);
            }

            double* entry = c + (row * columns + column) * Tiling.EntryLength + lane;
            (entry[0], entry[Tiling.Lanes]) = (-sum.Real, -sum.Imaginary);
        }
    }

    private static Complex Read(double* tile, int entry, int lane) =>
        new(tile[entry * Tiling.EntryLength + lane], tile[entry * Tiling.EntryLength + Tiling.Lanes + lane]);
}
