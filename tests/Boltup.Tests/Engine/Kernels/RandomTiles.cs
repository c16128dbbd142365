using System.Numerics;
using Boltup.Engine.Spectra;
using MathNet.Numerics.LinearAlgebra;

namespace Boltup.Tests.Engine.Kernels;

/// <summary>Matrices for kernel tests; seeded, so that every run sees the same.</summary>
internal static class RandomTiles
{
    /// <summary>Independent entries in [−1, 1): every lane pivots differently.</summary>
    public static TiledMatrix Random(int rows, int columns, int seed) =>
        Fill(rows, columns, new Random(seed), (random, _, _, _) => new Complex(2 * random.NextDouble() - 1, 2 * random.NextDouble() - 1));

    /// <summary>A modal sum over 8 neighbouring lines, as receptances look: smooth over the lanes, nearly rank 1 at a resonance.</summary>
    public static TiledMatrix SmoothFrf(int order, int seed)
    {
        var random = new Random(seed);
        int modes = order + 5;
        double[,] shapes = new double[modes, order];
        foreach (int i in Enumerable.Range(0, modes * order))
        {
            shapes[i / order, i % order] = 2 * random.NextDouble() - 1;
        }

        return Fill(order, order, random, (_, row, column, lane) =>
        {
            Complex sum = Complex.Zero;
            double hz = 100 + lane;
            for (int mode = 0; mode < modes; mode++)
            {
                double natural = 20 + 37.0 * mode;
                sum += shapes[mode, row] * shapes[mode, column] / (natural * natural * new Complex(1, 0.02) - hz * hz);
            }

            return sum;
        });
    }

    public static Matrix<Complex> Lane(TiledMatrix tile, int lane) =>
        Matrix<Complex>.Build.Dense(tile.Rows, tile.Columns, (i, j) => tile[lane, i, j]);

    public static void Set(TiledMatrix tile, int lane, int row, int column, Complex value)
    {
        Span<double> entry = tile.Entry(0, row, column);
        (entry[lane], entry[Tiling.Lanes + lane]) = (value.Real, value.Imaginary);
    }

    public static TiledMatrix Copy(TiledMatrix tile)
    {
        var copy = new TiledMatrix(Tiling.Lanes, tile.Rows, tile.Columns);
        tile.Tile(0).CopyTo(copy.Tile(0));
        return copy;
    }

    public static TiledMatrix Identity(int order) => Fill(order, order, new Random(0), (_, row, column, _) => row == column ? 1 : 0);

    public static void Scale(TiledMatrix tile, double factor)
    {
        foreach (ref double value in tile.Tile(0))
        {
            value *= factor;
        }
    }

    private static TiledMatrix Fill(int rows, int columns, Random random, Func<Random, int, int, int, Complex> value)
    {
        var tile = new TiledMatrix(Tiling.Lanes, rows, columns);
        for (int i = 0; i < rows * columns; i++)
        {
            for (int lane = 0; lane < Tiling.Lanes; lane++)
            {
                Set(tile, lane, i / columns, i % columns, value(random, i / columns, i % columns, lane));
            }
        }

        return tile;
    }
}
