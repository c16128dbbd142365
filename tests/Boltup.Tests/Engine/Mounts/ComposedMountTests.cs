using System.Numerics;
using Boltup.Engine.Mounts;
using Boltup.Engine.Spectra;
using Boltup.Tests.Support;
using CsCheck;

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

    /// <summary>Whatever is composed of elements that dissipate dissipates.</summary>
    [Fact]
    public void Composed_OfPassiveElements_IsPassive() =>
        Composed(4).Sample(mount => Assert.Empty(MountPassivity.Offending(mount, FrequencyAxis.Even(20, 90, 11))), iter: 300);

    /// <summary>As deep as a document may nest them, with the largest of all elements, on the small stack of a worker thread.</summary>
    [Fact]
    public void FillStiffness_SixteenNestedTwoPortsOfSixDirections_FitsASmallStack()
    {
        MountLaw mount = SixRods;
        for (int i = 1; i < 16; i++)
        {
            mount = i % 2 == 0 ? new SeriesMount([SixRods, mount]) : new ParallelMount([SixRods, mount]);
        }

        Complex found = Complex.NaN;
        var thread = new Thread(() => found = MountAt.Entry(mount, Hz), maxStackSize: 1 << 20);
        thread.Start();
        thread.Join();
        Assert.True(Complex.IsFinite(found));
    }

    private static Gen<MountLaw> Composed(int depth)
    {
        Gen<MountLaw> element = Gen.OneOf(
            Gen.Select(Gen.Double[1e4, 1e6], Gen.Double[0, 0.5]).Select(MountLaw (k, loss) => Chain.Mount(k, loss)),
            Gen.Select(Gen.Double[1e4, 1e6], Gen.Double[1.1, 10]).Select(
                MountLaw (k, d) => new RelaxingMount(Chain.Mount(k, 0), new Relaxation(d, 1e-3, 0.5))),
            Gen.Select(Gen.Double[1e4, 1e6], Gen.Double[0.01, 0.5]).Select(
                MountLaw (k, mass) => new Rod(k, mass, 0.05).Mount(FrequencyAxis.Even(20, 90, 11))));
        return depth == 0
            ? element
            : Gen.OneOf(
                element,
                Gen.Select(Composed(depth - 1), Composed(depth - 1)).Select(MountLaw (a, b) => new ParallelMount([a, b])),
                Gen.Select(Composed(depth - 1), Composed(depth - 1)).Select(MountLaw (a, b) => new SeriesMount([a, b])));
    }

    private static TwoPortMount SixRods
    {
        get
        {
            FrequencyAxis axis = FrequencyAxis.FromHertz([Hz]);
            (Complex driving, Complex transfer) = new Rod(4e5, 0.1, 0.06).Terms(Hz);
            return new TwoPortMount(Enum.GetValues<Direction>().Where(direction => direction <= Direction.RZ).Select(direction => new TwoPortTable(
                new StiffnessTable(direction, axis, [driving]),
                new StiffnessTable(direction, axis, [transfer]),
                new StiffnessTable(direction, axis, [transfer]),
                new StiffnessTable(direction, axis, [driving]))));
        }
    }

    private static DiagonalMount Spring(Direction direction, double stiffness) => new([new SpringDamper(direction, stiffness, 0, 0)]);

    private static ScaledMount Coupled(double scale) =>
        new(new MatrixMount(Translations, new double[,] { { 3, 1, 0 }, { 1, 4, 0.5 }, { 0, 0.5, 5 } }, 0.1, [0, 0, 0]), scale);
}
