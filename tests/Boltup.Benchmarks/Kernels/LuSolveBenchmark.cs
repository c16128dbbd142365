using BenchmarkDotNet.Attributes;
using Boltup.Engine.Kernels;
using Boltup.Engine.Spectra;

namespace Boltup.Benchmarks.Kernels;

/// <summary>LU and solve of 2,000 smooth FRF matrices, with n right-hand sides and with one, for every body of the kernel.</summary>
public class LuSolveBenchmark
{
    private const int Lines = 2000;

    private TiledMatrix _matrices = null!;
    private TiledMatrix _rightHandSides = null!;
    private TiledMatrix _work = null!;
    private BatchLu _lu = null!;

    [Params(6, 12, 24, 48, 96)]
    public int Order { get; set; }

    [Params(false, true)]
    public bool OneRightHandSide { get; set; }

    [ParamsSource(nameof(Variants))]
    public KernelVariant Variant { get; set; }

    public static IEnumerable<KernelVariant> Variants => KernelChoice.Available;

    [GlobalSetup]
    public void Prepare()
    {
        int columns = OneRightHandSide ? 1 : Order;
        _matrices = FrfTiles.ModalSum(Order, Lines);
        _rightHandSides = FrfTiles.Random(Order, columns, Lines);
        _work = new TiledMatrix(Tiling.Lanes, Order, columns);
        _lu = new BatchLu(Order, Variant);
    }

    [Benchmark]
    public void FactorAndSolve()
    {
        for (int tile = 0; tile < _matrices.TileCount; tile++)
        {
            _rightHandSides.Tile(tile).CopyTo(_work.Tile(0));
            _lu.Factor(_matrices.Tile(tile), Order);
            _lu.Solve(_work.Tile(0), _work.Columns);
        }
    }
}
