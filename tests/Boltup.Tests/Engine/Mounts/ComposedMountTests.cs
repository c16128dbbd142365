using System.Numerics;
using Boltup.Engine.Mounts;
using Boltup.Engine.Spectra;
using Boltup.Tests.Support;

namespace Boltup.Tests.Engine.Mounts;

public class ComposedMountTests
{
    private const double Hz = 40;

    private static readonly Direction[] Translations = [Direction.X, Direction.Y, Direction.Z];

    [Fact]
    public void Parallel_TwoSprings_Adds()
    {
        var mount = new ParallelMount([Chain.Mount(1e5, 0.1), Chain.Mount(3e5, 0.2, 50)]);
        Near.Equal(new Complex(4e5, 7e4 + 2 * Math.PI * Hz * 50), MountAt.Entry(mount, Hz), 1e-15);
        Assert.True(mount.IsDiagonal);
        Assert.Equal(0.2, mount.ConstantLossFactor);
    }

    [Fact]
    public void Parallel_DifferentDirections_HasThemAll()
    {
        var mount = new ParallelMount([Spring(Direction.Z, 5), Spring(Direction.X, 7)]);
        Assert.Equal([Direction.X, Direction.Z], mount.Directions);
        Assert.Equal(7, MountAt.Entry(mount, Hz, 0, 0));
        Assert.Equal(5, MountAt.Entry(mount, Hz, 1, 1));
        Assert.Equal(0, MountAt.Entry(mount, Hz, 0, 1));
    }

    [Fact]
    public void Parallel_SpringAndMatrix_AddsInPlace()
    {
        Complex[,] sum = MountAt.Matrix(new ParallelMount([Spring(Direction.Y, 10), Coupled(1)]), Hz);
        Near.Equal(new Complex(14, 0.4), sum[1, 1], 1e-15);
        Near.Equal(new Complex(1, 0.1), sum[0, 1], 1e-15);
    }

    [Fact]
    public void Series_ThreeSprings_AddsCompliances()
    {
        Complex[] k = [new(1e5, 1e4), new(3e5, 6e4), new(5e5, 0)];
        var mount = new SeriesMount([.. k.Select(value => Chain.Mount(value.Real, value.Imaginary / value.Real))]);
        Near.Equal(1 / k.Aggregate(Complex.Zero, (sum, value) => sum + 1 / value), MountAt.Entry(mount, Hz), 1e-14);
    }

    [Fact]
    public void Series_DirectionThatOneLeavesFree_CarriesNothing() => Assert.Equal(
        [Direction.X],
        new SeriesMount([new ParallelMount([Spring(Direction.X, 1), Spring(Direction.Y, 1)]), Spring(Direction.X, 1)]).Directions);

    /// <summary>(K⁻¹ + (2K)⁻¹)⁻¹ = 2K/3 for a full matrix.</summary>
    [Fact]
    public void Series_MatrixAndTwiceIt_IsTwoThirds()
    {
        Complex[,] whole = MountAt.Matrix(new SeriesMount([Coupled(1), Coupled(2)]), Hz);
        Complex[,] single = MountAt.Matrix(Coupled(1), Hz);
        for (int i = 0; i < 9; i++)
        {
            Assert.True(Complex.Abs(whole[i / 3, i % 3] - single[i / 3, i % 3] * 2 / 3) < 1e-14);
        }
    }

    [Fact]
    public void CanJoin_MatrixAndSpringOfOneDirection_IsFalse() =>
        Assert.False(SeriesMount.CanJoin([Coupled(1), Spring(Direction.X, 1)]));

    [Fact]
    public void Band_OfComposedMounts_IsWhereAllAreKnown()
    {
        TabledMount Table(double from, double to) =>
            new([new StiffnessTable(Direction.X, FrequencyAxis.FromHertz([from, to]), [1e5, 1e5])]);
        MountLaw[] mounts = [Table(10, 400), Chain.Mount(1, 0), Table(20, 500)];
        Assert.Equal((20, 400), new ParallelMount(mounts).Band);
        Assert.Equal((20, 400), new SeriesMount(mounts).Band);
        Assert.Null(new SeriesMount([Chain.Mount(1, 0), Chain.Mount(1, 0)]).Band);
    }

    private static DiagonalMount Spring(Direction direction, double stiffness) => new([new SpringDamper(direction, stiffness, 0, 0)]);

    private static ScaledMount Coupled(double scale) =>
        new(new MatrixMount(Translations, new double[,] { { 3, 1, 0 }, { 1, 4, 0.5 }, { 0, 0.5, 5 } }, 0.1, [0, 0, 0]), scale);
}
