using Boltup.Engine.Spectra;

namespace Boltup.Engine.Kernels;

/// <summary>Has the kernels compiled for this machine, so that a program can do so on another thread while it reads its input.</summary>
public static class KernelWarmUp
{
    private const int Order = 6;

    /// <summary>Solves one small system. Safe to call on any thread.</summary>
    public static void Run()
    {
        var matrix = new TiledMatrix(Tiling.Lanes, Order, Order);
        var columns = new TiledMatrix(Tiling.Lanes, Order, 3);
        for (int i = 0; i < Order; i++)
        {
            matrix.Entry(0, i, (i + 1) % Order).Fill(1);
            matrix.Entry(0, i, i)[i] = 2;
        }

        var lu = new BatchLu(Order);
        lu.Factor(matrix.Tile(0), Order);
        lu.Solve(columns.Tile(0), columns.Columns);
        lu.EstimateCondition(matrix.Tile(0), stackalloc double[Tiling.Lanes]);
        BatchProduct.Multiply(matrix.Tile(0), columns.Tile(0), new double[columns.TileLength], Order, Order, columns.Columns);
    }
}
