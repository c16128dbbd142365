using System.Numerics;
using Boltup.Engine.Kernels;
using Boltup.Engine.Spectra;
using MathNet.Numerics.LinearAlgebra;

namespace Boltup.Tests.Engine.Kernels;

public class BatchQrTests
{
    /// <summary>Relative to ‖A‖²‖X‖: Householder QR leaves Aᴴ(AX−B) at some rows·ε (Higham, section 20).</summary>
    private const double NormalResidual = 1e-13;

    private static readonly (int Rows, int Columns)[] Sizes =
        [(1, 1), (2, 1), (3, 2), (4, 4), (7, 3), (8, 8), (9, 5), (16, 6), (17, 13), (36, 12), (60, 24), (64, 64)];

    public static TheoryData<KernelVariant> Variants => [.. KernelChoice.Available];

    [Theory]
    [MemberData(nameof(Variants))]
    public void Solve_RandomMatrices_LeavesAResidualOrthogonalToTheColumns(KernelVariant variant)
    {
        foreach ((int rows, int columns) in Sizes)
        {
            TiledMatrix a = RandomTiles.Random(rows, columns, rows), b = RandomTiles.Random(rows, 1 + columns % 6, 7);
            TiledMatrix x = Solve(a, b, variant);
            for (int lane = 0; lane < Tiling.Lanes; lane++)
            {
                Matrix<Complex> matrix = RandomTiles.Lane(a, lane), solution = RandomTiles.Lane(x, lane);
                Matrix<Complex> residual = matrix.ConjugateTranspose() * (matrix * solution - RandomTiles.Lane(b, lane));
                double size = matrix.FrobeniusNorm() * (matrix.FrobeniusNorm() * solution.FrobeniusNorm() + RandomTiles.Lane(b, lane).FrobeniusNorm());
                Assert.True(residual.FrobeniusNorm() < NormalResidual * size, $"{rows}×{columns}");
            }
        }
    }

    /// <summary>MathNet's QR is the independent judge of the solution itself; random tall matrices are well conditioned.</summary>
    [Theory]
    [MemberData(nameof(Variants))]
    public void Solve_TallRandomMatrices_EqualsMathNet(KernelVariant variant)
    {
        TiledMatrix a = RandomTiles.Random(36, 12, 1), b = RandomTiles.Random(36, 5, 2);
        TiledMatrix x = Solve(a, b, variant);
        for (int lane = 0; lane < Tiling.Lanes; lane++)
        {
            Matrix<Complex> expected = RandomTiles.Lane(a, lane).QR().Solve(RandomTiles.Lane(b, lane));
            Assert.True((expected - RandomTiles.Lane(x, lane)).FrobeniusNorm() < 1e-13 * expected.FrobeniusNorm());
        }
    }

    [Theory]
    [MemberData(nameof(Variants))]
    public void Solve_TinyAndHugeNumbers_KeepsItsAccuracy(KernelVariant variant)
    {
        foreach (double size in new[] { 1e-200, 1e-12, 1e9, 1e200 })
        {
            TiledMatrix a = RandomTiles.Random(9, 4, 3), b = RandomTiles.Random(9, 2, 4);
            TiledMatrix expected = Solve(a, b, variant);
            RandomTiles.Scale(a, size);
            TiledMatrix x = Solve(a, b, variant);
            RandomTiles.Scale(x, size);
            for (int lane = 0; lane < Tiling.Lanes; lane++)
            {
                Matrix<Complex> reference = RandomTiles.Lane(expected, lane);
                Assert.True((reference - RandomTiles.Lane(x, lane)).FrobeniusNorm() < 1e-13 * reference.FrobeniusNorm());
            }
        }
    }

    [Theory]
    [MemberData(nameof(Variants))]
    public void Factor_DependentColumnsInOneLane_NamesThatLaneAlone(KernelVariant variant)
    {
        TiledMatrix a = RandomTiles.Random(8, 3, 5), b = RandomTiles.Random(8, 1, 6);
        TiledMatrix expected = Solve(a, b, variant);
        for (int row = 0; row < 8; row++)
        {
            RandomTiles.Set(a, 5, row, 2, 2 * a[5, row, 0] - Complex.ImaginaryOne * a[5, row, 1]);
        }

        var qr = new BatchQr(8, 3, variant);
        qr.Factor(a.Tile(0), 8, 3);
        var x = new TiledMatrix(Tiling.Lanes, 3, 1);
        qr.Solve(b.Tile(0), 1, x.Tile(0));
        Assert.Equal(1 << 5, qr.DeficientLanes);
        AssertOtherLanesEqual(expected, x, 5);
    }

    [Theory]
    [MemberData(nameof(Variants))]
    public void Solve_NaNZeroAndInfinityInSomeLanes_LeavesTheOtherLanesAlone(KernelVariant variant)
    {
        foreach (Complex bad in new Complex[] { new(double.NaN, 0), new(0, double.PositiveInfinity) })
        {
            TiledMatrix a = RandomTiles.Random(8, 3, 5), b = RandomTiles.Random(8, 1, 6);
            TiledMatrix expected = Solve(a, b, variant);
            RandomTiles.Set(a, 2, 4, 1, bad);
            TiledMatrix x = Solve(a, b, variant);
            Assert.False(Complex.IsFinite(x[2, 0, 0]));
            AssertOtherLanesEqual(expected, x, 2);
        }
    }

    [Fact]
    public void Factor_MoreColumnsThanRows_Throws() =>
        Assert.Throws<ArgumentOutOfRangeException>(() => new BatchQr(4, 4).Factor(RandomTiles.Random(2, 3, 1).Tile(0), 2, 3));

    private static void AssertOtherLanesEqual(TiledMatrix expected, TiledMatrix actual, int exceptLane)
    {
        for (int lane = 0; lane < Tiling.Lanes; lane++)
        {
            Assert.Equal(lane != exceptLane, expected[lane, 0, 0] == actual[lane, 0, 0]);
        }
    }

    private static TiledMatrix Solve(TiledMatrix a, TiledMatrix b, KernelVariant variant)
    {
        var qr = new BatchQr(a.Rows, a.Columns, variant);
        qr.Factor(a.Tile(0), a.Rows, a.Columns);
        var x = new TiledMatrix(Tiling.Lanes, a.Columns, b.Columns);
        qr.Solve(b.Tile(0), b.Columns, x.Tile(0));
        return x;
    }
}
