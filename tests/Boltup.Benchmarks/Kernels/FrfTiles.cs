using System.Numerics;
using Boltup.Engine.Spectra;

namespace Boltup.Benchmarks.Kernels;

/// <summary>Matrices of the kernel benchmarks.</summary>
internal static class FrfTiles
{
    /// <summary>A modal sum over 20 to 2000 Hz: the smooth FRFs that coupling sees.</summary>
    public static TiledMatrix ModalSum(int order, int lines) => ModalSum(order, order, lines);

    /// <summary>The same with the first columns only: indicators from interface dofs.</summary>
    public static TiledMatrix ModalSum(int order, int columns, int lines)
    {
        var random = new Random(order);
        int modes = order + 5;
        double[] shapes = [.. Enumerable.Range(0, modes * order).Select(_ => 2 * random.NextDouble() - 1)];
        var matrix = new TiledMatrix(lines, order, columns);
        var spectrum = new Complex[lines];
        for (int i = 0; i < order * columns; i++)
        {
            for (int line = 0; line < lines; line++)
            {
                double hz = 20 + 1980.0 * line / (lines - 1);
                Complex sum = Complex.Zero;
                for (int mode = 0; mode < modes; mode++)
                {
                    double natural = 20 + 37.0 * mode;
                    sum += shapes[mode * order + i / columns] * shapes[mode * order + i % columns]
                        / (natural * natural * new Complex(1, 0.02) - hz * hz);
                }

                spectrum[line] = sum;
            }

            matrix.ScatterSpectrum(i / columns, i % columns, spectrum);
        }

        return matrix;
    }

    /// <summary>Independent entries in [−1, 1): the worst case for pivoting.</summary>
    public static TiledMatrix Random(int rows, int columns, int lines)
    {
        var random = new Random(1);
        var matrix = new TiledMatrix(lines, rows, columns);
        for (int tile = 0; tile < matrix.TileCount; tile++)
        {
            foreach (ref double value in matrix.Tile(tile))
            {
                value = 2 * random.NextDouble() - 1;
            }
        }

        return matrix;
    }
}
