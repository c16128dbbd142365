using System.Globalization;
using Boltup.Engine.Kernels;
using Boltup.Engine.Spectra;

namespace Boltup.Benchmarks.Kernels;

/// <summary>
/// LU and solve against NumPy's batched solve on one BLAS thread, both in one run and taking turns, as a Markdown table. Needs python3
/// with NumPy; the variable PYTHON names another interpreter.
/// </summary>
internal static class NumPyRatios
{
    private const int Lines = 2000;
    private const int Turns = 3;

    private static readonly int[] Orders = [6, 12, 24, 48, 96];

    public static void Run(TextWriter output, params int[] orders)
    {
        output.WriteLine($"kernels {KernelChoice.Name}, 2,000 lines of smooth FRFs, shortest of several runs");
        output.WriteLine();
        output.WriteLine("| n | right-hand sides | NumPy, 1 thread | Boltup, 1 thread | ratio | 2 threads to 1 | GFLOP/s |");
        output.WriteLine("| --- | --- | --- | --- | --- | --- | --- |");
        foreach (int order in orders.Length > 0 ? orders : Orders)
        {
            WriteRow(output, order, order);
            WriteRow(output, order, 1);
        }
    }

    private static void WriteRow(TextWriter output, int order, int columns)
    {
        TiledMatrix a = FrfTiles.ModalSum(order, Lines);
        TiledMatrix b = FrfTiles.Random(order, columns, Lines);
        Worker[] single = [new Worker(order, columns)];
        Worker[] pair = [new Worker(order, columns), new Worker(order, columns)];
        double numPy = double.PositiveInfinity;
        double one = double.PositiveInfinity;
        double two = double.PositiveInfinity;
        for (int turn = 0; turn < Turns; turn++)
        {
            numPy = Math.Min(numPy, NumPy.Time("numpy_solve.py", order, columns, Lines));
            one = Math.Min(one, Shortest.Of(() => SolveAll(a, b, single)));
            two = Math.Min(two, Shortest.Of(() => SolveAll(a, b, pair)));
        }

        double flops = 8.0 * Lines * order * order * (order / 3.0 + columns);
        output.WriteLine(string.Create(
            CultureInfo.InvariantCulture,
            $"| {order} | {columns} | {1e3 * numPy:F2} ms | {1e3 * one:F2} ms | {numPy / one:F1} | {one / two:F2} | {flops / one / 1e9:F0} |"));
    }

    /// <summary>Solves all tiles on one or two threads, each with its own buffers, which are allocated once.</summary>
    private static void SolveAll(TiledMatrix a, TiledMatrix b, Worker[] workers)
    {
        int threads = workers.Length;
        Task[] others = [.. Enumerable.Range(1, threads - 1).Select(i => Task.Run(
            () => workers[i].Solve(a, b, a.TileCount * i / threads, a.TileCount * (i + 1) / threads)))];
        workers[0].Solve(a, b, 0, a.TileCount / threads);
        Task.WaitAll(others);
    }

    /// <summary>The buffers of one thread.</summary>
    private sealed class Worker(int order, int columns)
    {
        private readonly BatchLu _lu = new(order);
        private readonly TiledMatrix _work = new(Tiling.Lanes, order, columns);

        public void Solve(TiledMatrix a, TiledMatrix b, int from, int to)
        {
            for (int tile = from; tile < to; tile++)
            {
                b.Tile(tile).CopyTo(_work.Tile(0));
                _lu.Factor(a.Tile(tile), a.Rows);
                _lu.Solve(_work.Tile(0), b.Columns);
            }
        }
    }
}
