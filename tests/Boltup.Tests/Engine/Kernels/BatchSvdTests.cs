using System.Numerics;
using Boltup.Engine.Kernels;
using Boltup.Engine.Spectra;
using MathNet.Numerics.LinearAlgebra;

namespace Boltup.Tests.Engine.Kernels;

public class BatchSvdTests
{
    /// <summary>Singular values are good to a small multiple of n·ε of the largest (Drmač, Veselić 2008).</summary>
    private const double ValueTolerance = 1e-14;

    private static readonly (int Rows, int Columns)[] Sizes =
        [(1, 1), (2, 1), (3, 2), (4, 4), (7, 3), (8, 8), (9, 5), (17, 13), (36, 12), (60, 24), (60, 40)];

    public static TheoryData<KernelVariant> Variants => [.. KernelChoice.Available];

    [Theory]
    [MemberData(nameof(Variants))]
    public void SingularValues_RandomMatrices_EqualMathNet(KernelVariant variant)
    {
        foreach ((int rows, int columns) in Sizes)
        {
            AssertValues(RandomTiles.Random(rows, columns, rows), variant);
        }
    }

    /// <summary>Nearly rank 1 at a resonance: the small values are where a naive method fails.</summary>
    [Theory]
    [MemberData(nameof(Variants))]
    public void SingularValues_SmoothFrfs_EqualMathNet(KernelVariant variant)
    {
        foreach (int order in new[] { 2, 5, 12, 24 })
        {
            AssertValues(RandomTiles.SmoothFrf(order, order), variant);
        }
    }

    [Theory]
    [MemberData(nameof(Variants))]
    public void Combine_InverseValues_SolvesLikeQr(KernelVariant variant)
    {
        foreach ((int rows, int columns) in Sizes)
        {
            TiledMatrix a = RandomTiles.Random(rows, columns, rows + 1), b = RandomTiles.Random(rows, 1 + columns % 6, 3);
            TiledMatrix x = Apply(a, b, value => 1 / value, variant);
            var qr = new BatchQr(rows, columns, variant);
            var expected = new TiledMatrix(Tiling.Lanes, columns, b.Columns);
            qr.Factor(a.Tile(0), rows, columns);
            qr.Solve(b.Tile(0), b.Columns, expected.Tile(0));
            for (int lane = 0; lane < Tiling.Lanes; lane++)
            {
                double condition = RandomTiles.Lane(a, lane).ConditionNumber().Real;
                Matrix<Complex> difference = RandomTiles.Lane(expected, lane) - RandomTiles.Lane(x, lane);
                Assert.True(difference.FrobeniusNorm() < 1e-13 * condition * RandomTiles.Lane(expected, lane).FrobeniusNorm(), $"{rows}×{columns}");
            }
        }
    }

    /// <summary>σ/(σ²+λ²) is the solution of (AᴴA + λ²I)·x = Aᴴb (Tikhonov), computed independently here.</summary>
    [Theory]
    [MemberData(nameof(Variants))]
    public void Combine_TikhonovGains_SolvesTheDampedNormalEquations(KernelVariant variant)
    {
        const double damping = 0.7;
        TiledMatrix a = RandomTiles.Random(9, 4, 1), b = RandomTiles.Random(9, 2, 2);
        TiledMatrix x = Apply(a, b, value => value / (value * value + damping * damping), variant);
        for (int lane = 0; lane < Tiling.Lanes; lane++)
        {
            Matrix<Complex> matrix = RandomTiles.Lane(a, lane), adjoint = matrix.ConjugateTranspose();
            Matrix<Complex> expected = (adjoint * matrix + damping * damping * Matrix<Complex>.Build.DenseIdentity(4)).Solve(adjoint * RandomTiles.Lane(b, lane));
            Assert.True((expected - RandomTiles.Lane(x, lane)).FrobeniusNorm() < 1e-13 * expected.FrobeniusNorm());
        }
    }

    /// <summary>The pseudo-inverse of a rank-deficient matrix meets the four Penrose conditions when the zero value is left out.</summary>
    [Theory]
    [MemberData(nameof(Variants))]
    public void Combine_ZeroValueLeftOut_GivesThePseudoInverse(KernelVariant variant)
    {
        TiledMatrix a = RandomTiles.Random(6, 3, 5), identity = RandomTiles.Identity(6);
        for (int i = 0; i < 6 * Tiling.Lanes; i++)
        {
            RandomTiles.Set(a, i % Tiling.Lanes, i / Tiling.Lanes, 2, a[i % Tiling.Lanes, i / Tiling.Lanes, 0] * new Complex(1, 2));
        }

        TiledMatrix inverse = Apply(a, identity, value => value < 1e-10 ? 0 : 1 / value, variant);
        for (int lane = 0; lane < Tiling.Lanes; lane++)
        {
            Matrix<Complex> y = RandomTiles.Lane(a, lane), p = RandomTiles.Lane(inverse, lane);
            Assert.True((y * p * y - y).FrobeniusNorm() < 1e-13);
            Assert.True((p * y * p - p).FrobeniusNorm() < 1e-13);
            Assert.True((y * p - (y * p).ConjugateTranspose()).FrobeniusNorm() < 1e-13);
            Assert.True((p * y - (p * y).ConjugateTranspose()).FrobeniusNorm() < 1e-13);
        }
    }

    /// <summary>
    /// Columns over twelve decades: the smallest value is 1/‖A⁻¹‖, and A⁻¹ = D⁻¹·B⁻¹ is known to full relative accuracy for a
    /// well-conditioned B and powers of two in D. Bidiagonalisation loses it; Jacobi after a pivoted QR does not (Drmač, Veselić 2008).
    /// </summary>
    [Theory]
    [MemberData(nameof(Variants))]
    public void SingularValues_GradedColumns_KeepTheSmallestToFullRelativeAccuracy(KernelVariant variant)
    {
        const int order = 6;
        int[] exponents = [-16, -40, 0, -32, -8, -24];
        TiledMatrix b = RandomTiles.Random(order, order, 3), a = RandomTiles.Copy(b);
        for (int i = 0; i < order * order * Tiling.Lanes; i++)
        {
            (int entry, int lane) = Math.DivRem(i, Tiling.Lanes);
            RandomTiles.Set(a, lane, entry / order, entry % order, b[lane, entry / order, entry % order] * Math.ScaleB(1, exponents[entry % order]));
        }

        var svd = new BatchSvd(order, order, variant);
        svd.Factor(a.Tile(0), order, order);
        double[] values = svd.SingularValues.ToArray();
        for (int lane = 0; lane < Tiling.Lanes; lane++)
        {
            Matrix<Complex> inverse = RandomTiles.Lane(b, lane).Inverse();
            inverse = inverse.MapIndexed((row, _, value) => value * Math.ScaleB(1, -exponents[row]));
            double smallest = Enumerable.Range(0, order).Min(i => values[i * Tiling.Lanes + lane]);
            double condition = RandomTiles.Lane(b, lane).ConditionNumber().Real;
            Assert.Equal(1, smallest * inverse.L2Norm(), 1e-15 * 10 * condition);
        }
    }

    [Theory]
    [MemberData(nameof(Variants))]
    public void Condition_ZeroColumnNaNAndUnits_AreReportedPerLane(KernelVariant variant)
    {
        TiledMatrix a = RandomTiles.Identity(3);
        RandomTiles.Set(a, 1, 2, 2, 0);
        RandomTiles.Set(a, 2, 1, 1, new Complex(double.NaN, 0));
        RandomTiles.Set(a, 3, 0, 0, 1e-3);
        var svd = new BatchSvd(3, 3, variant);
        svd.Factor(a.Tile(0), 3, 3);
        double[] condition = new double[Tiling.Lanes];
        svd.Condition(condition);
        Assert.Equal(1, condition[0], 1e-14);
        Assert.Equal(double.PositiveInfinity, condition[1]);
        Assert.Equal(double.NaN, condition[2]);
        Assert.Equal(1000, condition[3], 1e-9);
        Assert.Equal(1, condition[4], 1e-14);
    }

    private static void AssertValues(TiledMatrix a, KernelVariant variant)
    {
        foreach (double size in new[] { 1, 1e-180, 1e150 })
        {
            TiledMatrix scaled = RandomTiles.Copy(a);
            RandomTiles.Scale(scaled, size);
            var svd = new BatchSvd(a.Rows, a.Columns, variant);
            svd.Factor(scaled.Tile(0), a.Rows, a.Columns);
            double[] values = svd.SingularValues.ToArray();
            for (int lane = 0; lane < Tiling.Lanes; lane++)
            {
                double[] expected = [.. RandomTiles.Lane(a, lane).Svd(false).S.Select(value => value.Real)];
                double[] actual = [.. Enumerable.Range(0, a.Columns).Select(i => values[i * Tiling.Lanes + lane] / size).OrderDescending()];
                for (int i = 0; i < expected.Length; i++)
                {
                    Assert.Equal(expected[i], actual[i], ValueTolerance * a.Rows * expected[0]);
                }
            }
        }
    }

    private static TiledMatrix Apply(TiledMatrix a, TiledMatrix b, Func<double, double> gain, KernelVariant variant)
    {
        var svd = new BatchSvd(a.Rows, a.Columns, variant);
        svd.Factor(a.Tile(0), a.Rows, a.Columns);
        var coefficients = new TiledMatrix(Tiling.Lanes, a.Columns, b.Columns);
        svd.Project(b.Tile(0), b.Columns, coefficients.Tile(0));
        double[] gains = [.. svd.SingularValues.ToArray().Select(gain)];
        var x = new TiledMatrix(Tiling.Lanes, a.Columns, b.Columns);
        svd.Combine(gains, coefficients.Tile(0), b.Columns, x.Tile(0));
        return x;
    }
}
