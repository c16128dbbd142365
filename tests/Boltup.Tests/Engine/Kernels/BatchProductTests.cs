using System.Numerics;
using Boltup.Engine.Kernels;
using Boltup.Engine.Spectra;
using MathNet.Numerics.LinearAlgebra;

namespace Boltup.Tests.Engine.Kernels;

public class BatchProductTests
{
    public static TheoryData<KernelVariant> Variants => [.. KernelChoice.Available];

    [Theory]
    [MemberData(nameof(Variants))]
    public void Multiply_AnySizes_EqualsMathNet(KernelVariant variant)
    {
        int[] sizes = [1, 2, 3, 4, 5, 7, 8, 13];
        foreach (int rows in sizes)
        {
            foreach (int inner in sizes)
            {
                foreach (int columns in sizes)
                {
                    AssertProduct(RandomTiles.Random(rows, inner, 1), RandomTiles.Random(inner, columns, 2), variant);
                }
            }
        }
    }

    [Theory]
    [MemberData(nameof(Variants))]
    public void Multiply_NaNInOneLane_StaysThere(KernelVariant variant)
    {
        TiledMatrix a = RandomTiles.Random(5, 6, 1);
        RandomTiles.Set(a, 3, 2, 2, double.NaN);
        TiledMatrix product = Multiply(a, RandomTiles.Random(6, 3, 2), variant);
        for (int lane = 0; lane < Tiling.Lanes; lane++)
        {
            Assert.Equal(lane == 3, RandomTiles.Lane(product, lane).Enumerate().Any(value => !Complex.IsFinite(value)));
        }
    }

    private static TiledMatrix Multiply(TiledMatrix a, TiledMatrix b, KernelVariant variant)
    {
        var product = new TiledMatrix(Tiling.Lanes, a.Rows, b.Columns);
        BatchProduct.Multiply(a.Tile(0), b.Tile(0), product.Tile(0), a.Rows, a.Columns, b.Columns, variant);
        return product;
    }

    private static void AssertProduct(TiledMatrix a, TiledMatrix b, KernelVariant variant)
    {
        TiledMatrix product = Multiply(a, b, variant);
        for (int lane = 0; lane < Tiling.Lanes; lane++)
        {
            Matrix<Complex> expected = RandomTiles.Lane(a, lane) * RandomTiles.Lane(b, lane);
            Assert.True((expected - RandomTiles.Lane(product, lane)).FrobeniusNorm() < 1e-14 * a.Columns * (1 + expected.FrobeniusNorm()));
        }
    }
}
