using System.Numerics;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Geometry;
using Boltup.Engine.Parts;
using Boltup.Engine.Spectra;
using Boltup.Tests.Support;
using CsCheck;

namespace Boltup.Tests.Engine.Parts;

public class PlacedPartTests
{
    private static readonly FrequencyAxis Axis = FrequencyAxis.FromHertz([10, 20]);
    private static readonly Vector3d AboutZ = new(0, 0, 1);

    /// <summary>A quarter turn about z brings the part's x to the assembly's y, by hand.</summary>
    [Theory]
    [InlineData(Direction.Y, "m1.x", 1.0)]
    [InlineData(Direction.X, "m1.y", -1.0)]
    [InlineData(Direction.Z, "m1.z", 1.0)]
    [InlineData(Direction.RY, "m1.rx", 1.0)]
    [InlineData(Direction.RX, "m1.ry", -1.0)]
    public void InAssemblyAxes_QuarterTurnAboutZ_IsOneOwnDof(Direction direction, string own, double cosine)
    {
        DofCombination combination = Place(Rotation.About(AboutZ, Math.PI / 2)).InAssemblyAxes(new Dof("m1", direction));
        Assert.Equal([new DofTerm(Dof.Parse(own), cosine)], combination.Terms);
    }

    [Fact]
    public void InAssemblyAxes_PointWithOwnAxes_CombinesBothTurns()
    {
        // The sensor's x looks along the part's y, the part is turned by a quarter: the sensor's x is the assembly's −x.
        PartPoint point = new("m1", null, new Rotation(new(0, 1, 0), new(-1, 0, 0), new(0, 0, 1)));
        var part = new PlacedPart("part", Chain.Part("p", [1]).Model, [point], Rotation.About(AboutZ, Math.PI / 2), Vector3d.Zero);
        Assert.Equal([new DofTerm(Dof.Parse("m1.x"), -1)], part.InAssemblyAxes(Dof.Parse("m1.x")).Terms);
    }

    [Fact]
    public void InAssemblyAxes_Pressure_HasNoDirection() =>
        Assert.True(Place(Rotation.About(AboutZ, 1)).InAssemblyAxes(Dof.Parse("ear.p")).IsOwnDof);

    [Fact]
    public void PositionOf_TurnedAndMoved_TurnsFirst()
    {
        PartPoint point = new("m1", new Vector3d(1, 0, 0.5), Rotation.None);
        var part = new PlacedPart(
            "part", Chain.Part("p", [1]).Model, [point], Rotation.About(AboutZ, Math.PI / 2), new Vector3d(10, 20, 30));
        Assert.Equal(new Vector3d(10, 21, 30.5), part.PositionOf("m1"));
        Assert.Null(part.PositionOf("other"));
    }

    /// <summary>Y' = R Y Rᵀ for any rotation, computed here with full 3×3 products.</summary>
    [Fact]
    public void Evaluate_AnyTurn_RotatesTheFrfTensor() =>
        Gen.Select(Gen.Double[-1, 1], Gen.Double[-1, 1], Gen.Double[0.1, 1], Gen.Double[-3, 3]).Sample((x, y, z, angle) =>
        {
            Rotation turn = Rotation.About(new Vector3d(x, y, z), angle);
            Complex[,] own = { { 5, new(1, 2), 0.5 }, { new(1, 2), 7, new(-1, 1) }, { 0.5, new(-1, 1), 3 } };
            TiledMatrix turned = Evaluate(turn, own);
            Vector3d[] axes = [turn.X, turn.Y, turn.Z];
            for (int i = 0; i < 3; i++)
            {
                for (int j = 0; j < 3; j++)
                {
                    Complex expected = Sum(k => Sum(l => axes[k][i] * own[k, l] * axes[l][j]));
                    Assert.True(Complex.Abs(expected - turned[1, i, j]) < 1e-12);
                }
            }
        });

    private static Complex Sum(Func<int, Complex> term) => term(0) + term(1) + term(2);

    private static PlacedPart Place(Rotation turned) => new("part", Chain.Part("p", [1]).Model, [], turned, Vector3d.Zero);

    private static TiledMatrix Evaluate(Rotation turn, Complex[,] own)
    {
        string[] names = ["m1.x", "m1.y", "m1.z"];
        IFrfCurve[] curves =
            [.. Enumerable.Range(0, 9).Select(i => new InMemoryCurve(
                names[i / 3], names[i % 3], FrfQuantity.Receptance, Axis, _ => own[i / 3, i % 3]))];
        var part = new PlacedPart("part", new MeasuredPart("part", curves, false, Axis), [], turn, Vector3d.Zero);
        DofCombination[] all = [.. names.Select(name => part.InAssemblyAxes(Dof.Parse(name)))];
        return part.Evaluate(Axis, all, all, new DiagnosticBag())!;
    }
}
