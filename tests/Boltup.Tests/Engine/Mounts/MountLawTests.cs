using System.Numerics;
using Boltup.Engine.Mounts;
using Boltup.Engine.Spectra;
using Boltup.Tests.Support;

namespace Boltup.Tests.Engine.Mounts;

public class MountLawTests
{
    private static readonly FrequencyAxis Axis = FrequencyAxis.FromHertz([10, 30, 100]);

    [Fact]
    public void DiagonalMount_SpringAndDamper_IsHystereticPlusViscous()
    {
        var mount = new DiagonalMount([new SpringDamper(Direction.Z, 2e5, 0.1, 40), new SpringDamper(Direction.X, 1e5, 0.2, 0)]);
        Assert.Equal([Direction.X, Direction.Z], mount.Directions);
        Near.Equal(new Complex(1e5, 2e4), At(mount, 1, 0, 0), 1e-15);
        Near.Equal(new Complex(2e5, 2e4 + 2 * Math.PI * 30 * 40), At(mount, 1, 1, 1), 1e-15);
        Assert.Equal(Complex.Zero, At(mount, 1, 0, 1));
    }

    [Fact]
    public void DiagonalMount_DirectionOfZeroStiffness_IsLeftOut() =>
        Assert.Equal(
            [Direction.Y],
            new DiagonalMount([new SpringDamper(Direction.X, 0, 0.1, 0), new SpringDamper(Direction.Y, 1, 0, 0)]).Directions);

    [Fact]
    public void TabledMount_BetweenLines_IsLinearInRealAndImaginaryParts()
    {
        StiffnessTable table = new(Direction.X, FrequencyAxis.FromHertz([10, 50, 100]), [new(1e5, 1e3), new(2e5, 5e3), new(3e5, 6e3)]);
        var mount = new TabledMount([table]);
        Near.Equal(new Complex(1.5e5, 3e3), At(mount, 1, 0, 0), 1e-15);
        Near.Equal(new Complex(3e5, 6e3), At(mount, 2, 0, 0), 1e-15);
        Assert.Equal((10, 100), mount.Band);
    }

    [Fact]
    public void MatrixMount_WithDampers_IsHystereticPlusViscousOnTheDiagonal()
    {
        Near.Equal(new Complex(4, 0.4 + 2 * Math.PI * 30 * 7), At(Coupled, 1, 1, 1), 1e-15);
        Near.Equal(new Complex(1, 0.1), At(Coupled, 1, 1, 0), 1e-15);
    }

    [Fact]
    public void ScaledMount_OfAMatrix_ScalesEveryEntry() =>
        Near.Equal(new Complex(0.5, 0.05), At(new ScaledMount(Coupled, 0.5), 0, 0, 1), 1e-15);

    private static MatrixMount Coupled => new(
        [Direction.X, Direction.Y, Direction.Z], new double[,] { { 3, 1, 0 }, { 1, 4, 0 }, { 0, 0, 5 } }, 0.1, [0, 7, 0]);

    private static Complex At(MountLaw mount, int line, int row, int column)
    {
        int order = mount.Directions.Count;
        var stiffness = new TiledMatrix(Axis.Count, order, order);
        mount.FillStiffness(Axis, 0, stiffness.Tile(0));
        return stiffness[line, row, column];
    }
}
