using System.Numerics;
using Boltup.Engine.Coupling;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Evidence;
using Boltup.Engine.Parts;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;
using Boltup.Tests.Support;

namespace Boltup.Tests.Engine.Evidence;

/// <summary>
/// The facts that must always hold (common practice of the trade), for forces as the routes find them: the source of the coupling table on
/// its bench B, and on another receiver of 1.5 kg and 0.5 kg. Responses at the far mass of the receiver.
/// </summary>
public class RouteTruthTests
{
    private const double Same = 1e-8;

    private static readonly PlacedPart Other = Chain.Part("C", [1.5, 0.5], [8e4], 0.05, (1, 1e5));

    [Fact]
    public void ContactForce_OnTheBenchAlone_GivesTheReference() => Near.Equal(Reference("B"), Alone("B", Contact().Forces), Same);

    [Fact]
    public void ContactForce_OnTheCoupledBench_IsWrong() => AssertWrong(Reference("B"), Coupled("B", Contact().Forces));

    [Fact]
    public void ContactForce_OnAnotherReceiverAlone_IsWrong() => AssertWrong(Reference("C"), Alone("C", Contact().Forces));

    [Fact]
    public void BlockedForce_OnTheBenchAlone_IsWrong() => AssertWrong(Reference("B"), Alone("B", Blocked().Forces));

    [Theory]
    [InlineData("B")]
    [InlineData("C")]
    public void BlockedForce_OnEitherCoupledReceiver_GivesItsReference(string receiver) =>
        Near.Equal(Reference(receiver), Coupled(receiver, Blocked().Forces), Same);

    private static void AssertWrong(Complex[] reference, Complex[] found) => Assert.True(Near.RelativeError(reference, found) > 0.1);

    private static RouteForces Contact()
    {
        PredictionResult run = LumpedBench.Run(LumpedBench.Resilient, Chain.At(Chain.End("A", 2)), Chain.At(Chain.End("B", 1)));
        return ContactForceRoutes.ThroughMounts(
            [new MountPath(LumpedBench.Mount, "2", "1")],
            LumpedBench.One(LumpedBench.SourceInterface, run.Spectrum(0)),
            LumpedBench.One(LumpedBench.ReceiverInterface, run.Spectrum(1)));
    }

    private static RouteForces Blocked()
    {
        FrfMatrix fromInside = LumpedBench.Frf(LumpedBench.Source, [LumpedBench.SourceInterface], [LumpedBench.SourceInside]);
        return FreeVelocityRoute.BlockedForces(
            LumpedBench.Frf(LumpedBench.Source, LumpedBench.SourceInterface),
            LumpedBench.One(LumpedBench.SourceInterface, fromInside.Values.GatherSpectrum(0, 0)),
            new DiagnosticBag())!;
    }

    private static PlacedPart Receiver(string name) => name == "B" ? LumpedBench.Receiver : Other;

    private static Complex[] Reference(string receiver) => Predict(receiver, Chain.Force(ForceKind.Applied, LumpedBench.Axis, Chain.End("A", 1), 1));

    private static Complex[] Coupled(string receiver, SpectrumSet forces) =>
        Predict(receiver, Chain.Force(ForceKind.Applied, LumpedBench.Axis, Chain.End("A", 2), forces.Values[0]));

    private static Complex[] Predict(string receiver, ForceSet force)
    {
        Joint joint = Chain.Through(LumpedBench.Mount, Chain.End("A", 2), Chain.End(receiver, 1));
        return Chain.Predict(LumpedBench.Axis, [LumpedBench.Source, Receiver(receiver)], [joint], [force], Chain.At(Chain.End(receiver, 2))).Spectrum();
    }

    private static Complex[] Alone(string receiver, SpectrumSet forces)
    {
        FrfMatrix frf = LumpedBench.Frf(Receiver(receiver), [LumpedBench.ReceiverFar], [LumpedBench.ReceiverInterface]);
        return ResponsePrediction.Of(frf, forces with { Dofs = [LumpedBench.ReceiverInterface] }).Values[0];
    }
}
