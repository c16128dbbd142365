using System.Numerics;
using Boltup.Engine.Coupling;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Geometry;
using Boltup.Engine.Parts;
using Boltup.Engine.Paths;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;
using Boltup.Tests.Support;
using CsCheck;

namespace Boltup.Tests.Engine.Paths;

public class OperationPathsTests
{
    private const double Rounding = 1e-12;

    private static readonly ForceSet OnLeft = TwoSources.Force(TwoSources.LeftFoot, new Complex(1, 0.5));
    private static readonly ForceSet OnRight = TwoSources.Force(TwoSources.RightFoot, new Complex(-0.3, 0.8));
    private static readonly ForceSet OnBase = TwoSources.Force(TwoSources.BaseTop, new Complex(0.2, -0.4));

    [Fact]
    public void Predict_NobodyAsksForPaths_HasNone()
    {
        var parts = new[] { Chain.Part("a", [1, 2], [1e5], 0.02) };
        OperationResult operation = Chain.Predict(
            TwoSources.Axis, parts, [], [Chain.Force(ForceKind.Applied, TwoSources.Axis, Chain.End("a", 1), 1)], Chain.At(Chain.End("a", 2))).Operations[0];
        Assert.Null(operation.Paths);
        Assert.Empty(operation.RankedPaths);
    }

    [Fact]
    public void Of_Forces_EachIsTheResponseToThatForceAlone()
    {
        PathSpectra all = TwoSources.Predict(ForceSum.Phase, OnLeft, OnRight).Paths(PathView.Forces);
        Assert.Equal(["left.2.x", "right.2.x"], all.Paths.Select(path => path.Name));
        Near.Equal(TwoSources.Predict(ForceSum.Phase, OnLeft).Responses[0].Values, all.Contribution(0), Rounding);
        Near.Equal(TwoSources.Predict(ForceSum.Phase, OnRight).Responses[0].Values, all.Contribution(1), Rounding);
    }

    [Fact]
    public void Of_JointsWithAForceOnTheResponsesPart_HasADirectPathAndSumsAllTheSame()
    {
        OperationResult operation = TwoSources.Predict(ForceSum.Phase, OnLeft, OnBase);
        PathSpectra joints = operation.Paths(PathView.Joints);
        Assert.Equal(
            [(PathKind.Joint, "left mount x"), (PathKind.Joint, "right mount x"), (PathKind.Direct, "forces on base")],
            joints.Paths.Select(path => (path.Kind, path.Name)));
        Near.Equal(operation.Responses[0].Values, joints.Sum(), Rounding);
        Near.Equal(operation.Responses[0].Values, operation.Paths(PathView.Forces).Sum(), Rounding);
    }

    [Fact]
    public void Of_JointsOfAMountWithMassEffect_TakesTheEndAtTheResponsesPart()
    {
        Joint[] joints =
        [
            Joint.Through(new Rod(4e5, 0.1, 0.06).Mount(TwoSources.Axis), "rod", TwoSources.LeftFoot, TwoSources.BaseTop),
        ];
        OperationResult operation = TwoSources.Predict(joints, ForceSum.Phase, Amplitude.Rms, OnLeft);
        PathSpectra paths = operation.Paths(PathView.Joints);
        Assert.Equal("rod x", Assert.Single(paths.Paths).Name);
        Near.Equal(operation.Responses[0].Values, paths.Sum(), Rounding);
    }

    [Fact]
    public void Of_JointThatNamesTheResponsesPartFirst_SumsToTheResponse()
    {
        Joint[] joints = [Joint.Rigid("turned about", TwoSources.BaseTop, TwoSources.LeftFoot, Direction.X)];
        OperationResult operation = TwoSources.Predict(joints, ForceSum.Phase, Amplitude.Rms, OnLeft);
        Near.Equal(operation.Responses[0].Values, operation.Paths(PathView.Joints).Sum(), Rounding);
    }

    /// <summary>The interface problem scales rotations by a length: forces and moments must come out of it in N and N·m.</summary>
    [Fact]
    public void Of_RotationsJoined_SumsToTheResponseInBothViews()
    {
        PlacedPart[] parts = [Placed("source", 1), Placed("receiver", 2)];
        Direction[] all = [Direction.X, Direction.Y, Direction.Z, Direction.RX, Direction.RY, Direction.RZ];
        Joint joint = Joint.Rigid("flange", new JointEnd("source", "2"), new JointEnd("receiver", "1"), all);
        Complex[] spectrum = [.. TwoSources.Axis.Hz.ToArray().Select(hz => new Complex(1, hz / 50))];
        var forces = new ForceSet(ForceKind.Applied, "source", TwoSources.Axis, [Dof.Parse("1.z"), Dof.Parse("2.ry")], [spectrum, spectrum]);
        var response = new Response("turning", "receiver", Dof.Parse("2.rx"), Quantity.Velocity);
        var operation = new Operation("run", ForceSum.Phase, Amplitude.Rms, [forces]);
        var assembly = new AssemblyModel("flange", TwoSources.Axis, parts, [joint], [operation], [response]);
        OperationResult result = Predictor.Predict(assembly, new DiagnosticBag(), withPaths: true)!.Operations[0];
        Assert.Equal(6, result.Paths(PathView.Joints).Paths.Count);
        Near.Equal(result.Responses[0].Values, result.Paths(PathView.Joints).Sum(), Rounding);
        Near.Equal(result.Responses[0].Values, result.Paths(PathView.Forces).Sum(), 1e-10);
    }

    [Fact]
    public void Of_NothingJoined_IsTheDirectPath()
    {
        OperationResult operation = TwoSources.Predict([], ForceSum.Phase, Amplitude.Rms, OnBase);
        Near.Equal(operation.Responses[0].Values, operation.Paths(PathView.Forces).Sum(), Rounding);
        Assert.Equal([PathView.Forces], operation.RankedPaths.Select(paths => paths.View));
    }

    [Theory]
    [InlineData(PathView.Forces)]
    [InlineData(PathView.Joints)]
    public void TotalPower_SumOfEnergies_IsThePowerOfTheResponse(PathView view)
    {
        OperationResult operation = TwoSources.Predict(ForceSum.Energy, OnLeft, OnRight);
        PathSpectra paths = operation.Paths(view);
        double power = operation.Responses[0].Values.Sum(value => value.Real * value.Real);
        Assert.False(paths.HavePhase);
        Assert.Equal(power, paths.TotalPower(LineWeights.All(paths.Lines)), Rounding * power);
        Assert.All(paths.Contribution(0), value => Assert.True(value.Real >= 0 && value.Imaginary == 0));
    }

    [Fact]
    public void TotalPower_PeakLines_IsHalfTheirSquares()
    {
        OperationResult operation = TwoSources.Predict(ForceSum.Phase, Amplitude.Peak, OnLeft);
        double squares = operation.Responses[0].Values.Sum(value => Complex.Abs(value) * Complex.Abs(value));
        Assert.Equal(squares / 2, operation.Paths(PathView.Forces).TotalPower(LineWeights.All(TwoSources.Axis.Count)), Rounding * squares);
    }

    /// <summary>Contributions of a joint and of a force follow a force in size and phase, whatever the force.</summary>
    [Fact]
    public void Of_ForceTimesANumber_GivesContributionsTimesThatNumber()
    {
        PathSpectra one = TwoSources.Predict(ForceSum.Phase, OnLeft).Paths(PathView.Joints);
        Gen.Select(Gen.Double[-100, 100], Gen.Double[0.1, 100]).Sample(
            (real, imaginary) =>
            {
                var factor = new Complex(real, imaginary);
                ForceSet force = TwoSources.Force(TwoSources.LeftFoot, new Complex(1, 0.5) * factor);
                PathSpectra scaled = TwoSources.Predict(ForceSum.Phase, force).Paths(PathView.Joints);
                Near.Equal([.. one.Contribution(0).Select(value => value * factor)], scaled.Contribution(0), Rounding);
            },
            iter: 20);
    }

    private static PlacedPart Placed(string name, int seed) => new(name, new InventedPart(seed), [], Rotation.None, Vector3d.Zero);
}
