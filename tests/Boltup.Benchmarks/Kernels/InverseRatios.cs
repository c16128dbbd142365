using System.Globalization;
using Boltup.Engine.Kernels;
using Boltup.Engine.Spectra;

namespace Boltup.Benchmarks.Kernels;

/// <summary>
/// Least squares and SVD against NumPy on one BLAS thread, both in one run and taking turns, as a Markdown table. Least squares is judged
/// by the faster of NumPy's two ways.
/// </summary>
internal static class InverseRatios
{
    private const int Lines = 2000;
    private const int Turns = 3;

    public static void Run(TextWriter output)
    {
        output.WriteLine($"kernels {KernelChoice.Name}, 2,000 lines of smooth FRFs, one right-hand side, one thread, shortest of several runs");
        output.WriteLine();
        output.WriteLine("| size | work | NumPy | Boltup | ratio |");
        output.WriteLine("| --- | --- | --- | --- | --- |");
        foreach ((int rows, int columns) in new[] { (36, 12), (60, 24) })
        {
            TiledMatrix a = FrfTiles.ModalSum(rows, columns, Lines);
            WriteRow(output, rows, columns, "least squares", ["lstsq", "qr"], LeastSquares(a));
            WriteRow(output, rows, columns, "SVD", ["svd"], Decompose(a));
        }
    }

    private static Action LeastSquares(TiledMatrix a)
    {
        TiledMatrix b = FrfTiles.Random(a.Rows, 1, a.Lines);
        var x = new TiledMatrix(Tiling.Lanes, a.Columns, 1);
        var qr = new BatchQr(a.Rows, a.Columns);
        return () =>
        {
            for (int tile = 0; tile < a.TileCount; tile++)
            {
                qr.Factor(a.Tile(tile), a.Rows, a.Columns);
                qr.Solve(b.Tile(tile), 1, x.Tile(0));
            }
        };
    }

    private static Action Decompose(TiledMatrix a)
    {
        var svd = new BatchSvd(a.Rows, a.Columns);
        return () =>
        {
            for (int tile = 0; tile < a.TileCount; tile++)
            {
                svd.Factor(a.Tile(tile), a.Rows, a.Columns);
            }
        };
    }

    private static void WriteRow(TextWriter output, int rows, int columns, string name, string[] ways, Action work)
    {
        double ours = double.PositiveInfinity, numPy = double.PositiveInfinity;
        for (int turn = 0; turn < Turns; turn++)
        {
            ours = Math.Min(ours, Shortest.Of(work));
            numPy = Math.Min(numPy, ways.Min(way => NumPy.Time("numpy_inverse.py", rows, columns, Lines, way)));
        }

        output.WriteLine(string.Create(
            CultureInfo.InvariantCulture, $"| {rows}×{columns} | {name} | {1e3 * numPy:F2} ms | {1e3 * ours:F2} ms | {numPy / ours:F1} |"));
    }
}
