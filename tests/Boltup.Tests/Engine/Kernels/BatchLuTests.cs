using System.Numerics;
using Boltup.Engine.Kernels;
using Boltup.Engine.Spectra;
using MathNet.Numerics.LinearAlgebra;

namespace Boltup.Tests.Engine.Kernels;

public class BatchLuTests
{
    /// <summary>Normwise backward error ‖AX−B‖/(‖A‖‖X‖+‖B‖) that double precision allows: some n·ε with n ≤ 100, and usually far less.</summary>
    private const double BackwardError = 1e-14;

    /// <summary>All sizes up to 20, then around the edges of panels (8), blocks (4, 2) and column chunks (12).</summary>
    private static readonly int[] Orders = [.. Enumerable.Range(1, 14), 16, 17, 24, 25, 33, 48, 65, 100];

    public static TheoryData<KernelVariant> Variants => [.. KernelChoice.Available];

    [Theory]
    [MemberData(nameof(Variants))]
    public void Solve_RandomMatrices_HasTinyBackwardError(KernelVariant variant)
    {
        foreach (int order in Orders)
        {
            AssertSolves(RandomTiles.Random(order, order, order), RandomTiles.Random(order, 1 + order % 13, 7), variant);
        }
    }

    [Theory]
    [MemberData(nameof(Variants))]
    public void Solve_SmoothFrfs_HasTinyBackwardError(KernelVariant variant)
    {
        foreach (int order in Orders)
        {
            AssertSolves(RandomTiles.SmoothFrf(order, order), RandomTiles.Random(order, order, 3), variant);
        }
    }

    /// <summary>MathNet's own LU is the independent judge of the solution itself, where the matrix is well conditioned.</summary>
    [Theory]
    [MemberData(nameof(Variants))]
    public void Solve_WellConditioned_EqualsMathNet(KernelVariant variant)
    {
        foreach (int order in Orders)
        {
            TiledMatrix a = RandomTiles.Random(order, order, order);
            for (int i = 0; i < order * Tiling.Lanes; i++)
            {
                RandomTiles.Set(a, i % Tiling.Lanes, i / Tiling.Lanes, i / Tiling.Lanes, 2 * order);
            }

            TiledMatrix b = RandomTiles.Random(order, 3, 5);
            TiledMatrix x = Solve(a, b, variant);
            for (int lane = 0; lane < Tiling.Lanes; lane++)
            {
                Matrix<Complex> expected = RandomTiles.Lane(a, lane).LU().Solve(RandomTiles.Lane(b, lane));
                Assert.True((expected - RandomTiles.Lane(x, lane)).FrobeniusNorm() < 1e-13 * expected.FrobeniusNorm());
            }
        }
    }

    [Theory]
    [MemberData(nameof(Variants))]
    public void SolveTransposed_AnyMatrix_SolvesWithThePlainTranspose(KernelVariant variant)
    {
        foreach (int order in Orders)
        {
            TiledMatrix a = RandomTiles.Random(order, order, order + 1);
            TiledMatrix b = RandomTiles.Random(order, 2, 11);
            var lu = new BatchLu(order, variant);
            TiledMatrix x = RandomTiles.Copy(b);
            lu.Factor(a.Tile(0), order);
            lu.SolveTransposed(x.Tile(0), 2);
            for (int lane = 0; lane < Tiling.Lanes; lane++)
            {
                AssertBackward(RandomTiles.Lane(a, lane).Transpose(), RandomTiles.Lane(x, lane), RandomTiles.Lane(b, lane));
            }
        }
    }

    [Theory]
    [MemberData(nameof(Variants))]
    public void Factor_SmallerThanTheMaximum_ReusesTheBuffers(KernelVariant variant)
    {
        var lu = new BatchLu(33, variant);
        foreach (int order in new[] { 33, 5, 12, 33, 2 })
        {
            TiledMatrix a = RandomTiles.Random(order, order, 40 + order);
            TiledMatrix b = RandomTiles.Random(order, 4, 41);
            TiledMatrix x = RandomTiles.Copy(b);
            lu.Factor(a.Tile(0), order);
            lu.Solve(x.Tile(0), 4);
            AssertBackward(RandomTiles.Lane(a, 3), RandomTiles.Lane(x, 3), RandomTiles.Lane(b, 3));
        }
    }

    /// <summary>What is wrong in one lane is wrong in that lane only, bit for bit.</summary>
    [Theory]
    [MemberData(nameof(Variants))]
    public void Solve_SpoiltLane_LeavesTheOthersUntouched(KernelVariant variant)
    {
        Complex[] spoilers = [double.NaN, double.PositiveInfinity, new(0, double.NegativeInfinity), double.Epsilon, new(1e300, 1e300)];
        foreach (int order in new[] { 1, 2, 3, 6, 7, 12, 17, 24 })
        {
            foreach (Complex spoiler in spoilers)
            {
                TiledMatrix a = RandomTiles.SmoothFrf(order, order);
                TiledMatrix b = RandomTiles.Random(order, 5, 2);
                TiledMatrix clean = Solve(a, b, variant);
                int lane = order % Tiling.Lanes;
                RandomTiles.Set(a, lane, order - 1, order / 2, spoiler);
                TiledMatrix spoilt = Solve(a, b, variant);
                foreach (int other in Enumerable.Range(0, Tiling.Lanes).Where(other => other != lane))
                {
                    AssertBackward(RandomTiles.Lane(a, other), RandomTiles.Lane(spoilt, other), RandomTiles.Lane(b, other));
                    Assert.True((RandomTiles.Lane(clean, other) - RandomTiles.Lane(spoilt, other)).FrobeniusNorm()
                        < 1e-6 * RandomTiles.Lane(clean, other).FrobeniusNorm());
                }
            }
        }
    }

    [Theory]
    [MemberData(nameof(Variants))]
    public void Factor_SingularLanes_AreMarkedAndNoOthers(KernelVariant variant)
    {
        foreach (int order in new[] { 1, 2, 5, 6, 12, 13 })
        {
            TiledMatrix a = RandomTiles.Random(order, order, 9);
            for (int i = 0; i < order; i++)
            {
                RandomTiles.Set(a, 2, i, order / 2, Complex.Zero);
                RandomTiles.Set(a, 5, i, 0, double.NaN);
            }

            var lu = new BatchLu(order, variant);
            lu.Factor(a.Tile(0), order);
            Assert.Equal(0b100100, lu.SingularLanes);
            var condition = new double[Tiling.Lanes];
            lu.EstimateCondition(a.Tile(0), condition);
            Assert.Equal([2, 5], Enumerable.Range(0, 8).Zip(condition).Where(pair => double.IsInfinity(pair.Second)).Select(pair => pair.First));
        }
    }

    /// <summary>Huge and tiny entries: pivots and reciprocals must not overflow before the result does.</summary>
    [Theory]
    [MemberData(nameof(Variants))]
    public void Solve_ExtremeScales_DoesNotOverflowEarly(KernelVariant variant)
    {
        foreach (double scale in new[] { 1e-290, 1e-160, 1e160, 1e290 })
        {
            TiledMatrix a = RandomTiles.Random(6, 6, 1);
            TiledMatrix b = RandomTiles.Random(6, 2, 2);
            TiledMatrix expected = Solve(a, b, variant);
            foreach (ref double value in a.Tile(0))
            {
                value *= scale;
            }

            TiledMatrix x = Solve(a, b, variant);
            for (int lane = 0; lane < Tiling.Lanes; lane++)
            {
                Matrix<Complex> scaledBack = RandomTiles.Lane(x, lane).Multiply(scale);
                Assert.True((scaledBack - RandomTiles.Lane(expected, lane)).FrobeniusNorm() < 1e-10 * RandomTiles.Lane(expected, lane).FrobeniusNorm());
            }
        }
    }

    /// <summary>Hager's and Higham's estimate is a lower bound, and rarely more than threefold too low.</summary>
    [Theory]
    [MemberData(nameof(Variants))]
    public void EstimateCondition_RandomAndGraded_IsNearTheTrueValue(KernelVariant variant)
    {
        foreach (int order in new[] { 1, 2, 3, 6, 12, 13, 24 })
        {
            AssertCondition(RandomTiles.Random(order, order, order), variant);
            AssertCondition(RandomTiles.SmoothFrf(order, order), variant);
            TiledMatrix graded = RandomTiles.Random(order, order, order);
            for (int i = 0; i < order * order; i++)
            {
                foreach (ref double value in graded.Entry(0, i / order, i % order))
                {
                    value *= Math.Pow(10, -(i / order) * 8.0 / order);
                }
            }

            AssertCondition(graded, variant);
        }
    }

    private static void AssertCondition(TiledMatrix a, KernelVariant variant)
    {
        var lu = new BatchLu(a.Rows, variant);
        lu.Factor(a.Tile(0), a.Rows);
        Span<double> estimate = stackalloc double[Tiling.Lanes];
        lu.EstimateCondition(a.Tile(0), estimate);
        for (int lane = 0; lane < Tiling.Lanes; lane++)
        {
            Matrix<Complex> matrix = RandomTiles.Lane(a, lane);
            double exact = matrix.L1Norm() * matrix.Inverse().L1Norm();
            Assert.InRange(estimate[lane], exact / 3, exact * 1.001);
        }
    }

    private static TiledMatrix Solve(TiledMatrix a, TiledMatrix b, KernelVariant variant)
    {
        var lu = new BatchLu(a.Rows, variant);
        TiledMatrix x = RandomTiles.Copy(b);
        lu.Factor(a.Tile(0), a.Rows);
        lu.Solve(x.Tile(0), b.Columns);
        return x;
    }

    private static void AssertSolves(TiledMatrix a, TiledMatrix b, KernelVariant variant)
    {
        TiledMatrix x = Solve(a, b, variant);
        for (int lane = 0; lane < Tiling.Lanes; lane++)
        {
            AssertBackward(RandomTiles.Lane(a, lane), RandomTiles.Lane(x, lane), RandomTiles.Lane(b, lane));
        }
    }

    private static void AssertBackward(Matrix<Complex> a, Matrix<Complex> x, Matrix<Complex> b)
    {
        double error = (a * x - b).FrobeniusNorm() / (a.FrobeniusNorm() * x.FrobeniusNorm() + b.FrobeniusNorm());
        Assert.True(error < BackwardError, FormattableString.Invariant($"order {a.RowCount}: backward error {error:E2}"));
    }
}
