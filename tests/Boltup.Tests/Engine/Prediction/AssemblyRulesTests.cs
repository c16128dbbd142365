using System.Numerics;
using Boltup.Engine;
using Boltup.Engine.Coupling;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Geometry;
using Boltup.Engine.Parts;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;
using Boltup.Tests.Support;

namespace Boltup.Tests.Engine.Prediction;

public class AssemblyRulesTests
{
    private static readonly FrequencyAxis Axis = FrequencyAxis.FromHertz([10, 20, 30]);
    private static readonly PlacedPart Source = Chain.Part("source", [1, 2], [1e5], 0.02);
    private static readonly PlacedPart Receiver = Chain.Part("receiver", [3, 4], [5e4], 0.02, (2, 2e5));
    private static readonly JointEnd Inside = Chain.End("source", 1);
    private static readonly JointEnd Interface = Chain.End("source", 2);
    private static readonly JointEnd Foot = Chain.End("receiver", 1);
    private static readonly JointEnd Seat = Chain.End("receiver", 2);
    private static readonly Joint Mounted = Chain.Through(Chain.Mount(8e4, 0.1), Interface, Foot);

    [Fact]
    public void Predict_ResponseInsideTheSource_IsRefusedForBlockedForces() =>
        AssertError(EngineCodes.ResponseInsideSource, [Mounted], [Blocked(Interface)], Chain.At(Inside));

    [Fact]
    public void Predict_ResponseAtTheInterfaceOfTheSource_IsTheTrueMotion()
    {
        Complex[] held = Chain.Predict(
            Axis, [Source], [Chain.Rigid(Interface, JointEnd.Ground)], [Applied(Inside)], Chain.At(Inside)).JointForce();
        Complex[] truth = Chain.Predict(Axis, [Source, Receiver], [Mounted], [Applied(Inside)], Chain.At(Interface)).Spectrum();
        ForceSet blocked = Chain.Force(ForceKind.Blocked, Axis, Interface, held);
        Near.Equal(truth, Chain.Predict(Axis, [Source, Receiver], [Mounted], [blocked], Chain.At(Interface)).Spectrum(), 1e-12);
    }

    [Fact]
    public void Predict_BlockedForceAwayFromAnyJoint_IsAnError() =>
        AssertError(EngineCodes.BlockedForceOffInterface, [Mounted], [Blocked(Inside)], Chain.At(Seat));

    [Fact]
    public void Predict_ResponseThatNoForceReaches_IsAnError() =>
        AssertError(
            EngineCodes.ResponseNotReached, [Chain.Rigid(Interface, JointEnd.Ground)], [Applied(Inside)], Chain.At(Seat));

    [Fact]
    public void Predict_SameRigidJointTwice_NamesJointsAndLines()
    {
        Joint twice = Joint.Rigid("again", Interface, Foot, Direction.X);
        Diagnostic error = AssertError(
            EngineCodes.SingularInterface, [Chain.Rigid(Interface, Foot), twice], [Applied(Inside)], Chain.At(Seat));
        Assert.Contains("at 10, 20 and 30 Hz (3 of 3 lines)", error.Message, StringComparison.Ordinal);
        Assert.Contains("`joint x`, `again x`", error.Notes[0], StringComparison.Ordinal);
        Assert.Equal(ErrorKind.UnsupportedByData, error.Code.Kind);
    }

    [Fact]
    public void Predict_JointThatClosesOnItself_IsSingular() =>
        AssertError(EngineCodes.SingularInterface, [Mounted, Joint.Rigid("loop", Foot, Foot, Direction.X)], [Applied(Inside)], Chain.At(Seat));

    [Fact]
    public void Predict_DirectionThatAPartDoesNotHave_NamesIt()
    {
        Joint tooMuch = Joint.Rigid("joint", Interface, Foot, Direction.X, Direction.Z);
        var diagnostics = new DiagnosticBag();
        Assert.Null(Chain.Predict(Axis, [Source, Receiver], [tooMuch], [Applied(Inside)], [Chain.At(Seat)], diagnostics));
        Assert.Equal(
            ["part `source` has no data at `2.z`, which the assembly needs", "part `receiver` has no data at `1.z`, which the assembly needs"],
            diagnostics.Items.Select(item => item.Message));
    }

    [Fact]
    public void Predict_ForcesWithoutACommonLine_IsAnError()
    {
        ForceSet elsewhere = Chain.Force(ForceKind.Applied, FrequencyAxis.FromHertz([11, 21]), Inside, 1);
        AssertError(EngineCodes.NoCommonAxis, [Mounted], [elsewhere], Chain.At(Seat));
    }

    [Fact]
    public void Predict_ForcesOnSomeLines_GivesThoseAndSaysWhatWasLeft()
    {
        var diagnostics = new DiagnosticBag();
        ForceSet some = Chain.Force(ForceKind.Applied, FrequencyAxis.FromHertz([20, 30, 40]), Inside, 1);
        PredictionResult? result = Chain.Predict(Axis, [Source, Receiver], [Mounted], [some], [Chain.At(Seat)], diagnostics);
        Assert.Equal([20, 30], result!.Operations[0].Axis.Hz.ToArray());
        Assert.Equal(EngineCodes.ForceLinesUnused, Assert.Single(diagnostics.Items).Code);
        Complex[] all = Chain.Predict(Axis, [Source, Receiver], [Mounted], [Applied(Inside)], Chain.At(Seat)).Spectrum();
        Near.Equal(all[1..], result.Spectrum(), 1e-15);
    }

    [Fact]
    public void Predict_PartWithoutAJoint_IsAWarning()
    {
        var diagnostics = new DiagnosticBag();
        PlacedPart spare = Chain.Part("spare", [1]);
        Assert.NotNull(Chain.Predict(
            Axis, [Source, Receiver, spare], [Mounted], [Applied(Inside)], [Chain.At(Seat)], diagnostics));
        Assert.Equal("part `spare` is not connected: no joint names one of its points", Assert.Single(diagnostics.Items).Message);
    }

    [Fact]
    public void Predict_NoOperations_SaysThatNothingIsAsked()
    {
        var diagnostics = new DiagnosticBag();
        var assembly = new AssemblyModel("empty", Axis, [Source, Receiver], [Mounted], [], [Chain.At(Seat)]);
        Assert.NotNull(Predictor.Predict(assembly, diagnostics));
        Assert.Equal("`empty` has no operations: there is nothing to predict", Assert.Single(diagnostics.Items).Message);
    }

    [Fact]
    public void Predict_JoinedPointsApart_IsAWarningWithTheDistance()
    {
        PlacedPart Placed(PlacedPart part, string point, double x) =>
            new(part.Name, part.Model, [new PartPoint(point, new Vector3d(x, 0, 0), Rotation.None)], Rotation.None, Vector3d.Zero);
        var diagnostics = new DiagnosticBag();
        Assert.NotNull(Chain.Predict(
            Axis, [Placed(Source, "2", 0.01), Placed(Receiver, "1", 0.184)], [Mounted], [Applied(Inside)], [Chain.At(Seat)], diagnostics));
        Diagnostic warning = Assert.Single(diagnostics.Items);
        Assert.Equal(EngineCodes.JointGap, warning.Code);
        Assert.Contains("174 mm apart", warning.Message, StringComparison.Ordinal);
    }

    private static ForceSet Applied(JointEnd at) => Chain.Force(ForceKind.Applied, Axis, at, 1);

    private static ForceSet Blocked(JointEnd at) => Chain.Force(ForceKind.Blocked, Axis, at, 1);

    private static Diagnostic AssertError(DiagnosticCode code, Joint[] joints, ForceSet[] forces, Response response)
    {
        var diagnostics = new DiagnosticBag();
        Assert.Null(Chain.Predict(Axis, [Source, Receiver], joints, forces, [response], diagnostics));
        return Assert.Single(diagnostics.Items, item => item.Code == code && item.Severity == Severity.Error);
    }
}
