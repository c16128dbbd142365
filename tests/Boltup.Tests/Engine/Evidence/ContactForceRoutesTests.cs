using System.Numerics;
using Boltup.Engine.Evidence;
using Boltup.Engine.Mounts;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;
using Boltup.Tests.Support;

namespace Boltup.Tests.Engine.Evidence;

public class ContactForceRoutesTests
{
    [Fact]
    public void ThroughMounts_MotionOnBothSides_GivesTheContactForceAndNotTheBlockedForce()
    {
        PredictionResult run = LumpedBench.Run(LumpedBench.Resilient, Chain.At(Chain.End("A", 2)), Chain.At(Chain.End("B", 1)));
        RouteForces route = ContactForceRoutes.ThroughMounts(
            [new MountPath(LumpedBench.Mount, "2", "1")],
            LumpedBench.One(LumpedBench.SourceInterface, run.Spectrum(0)),
            LumpedBench.One(LumpedBench.ReceiverInterface, run.Spectrum(1)));
        Assert.Equal((ForceRoute.MountStiffness, ForceNature.Contact), (route.Route, route.Nature));
        Assert.Equal([LumpedBench.ReceiverInterface], route.Forces.Dofs);
        Near.Equal(run.JointForce(), route.Forces.Values[0], 1e-9);
        Assert.True(Near.RelativeError(LumpedBench.BlockedForce, route.Forces.Values[0]) > 0.4);
    }

    [Fact]
    public void ThroughMounts_MatrixMount_UsesEveryDirection()
    {
        var mount = new MatrixMount([Direction.X, Direction.Z], new double[,] { { 3, 1 }, { 1, 5 } }, 0.5, [0, 0]);
        FrequencyAxis axis = FrequencyAxis.Even(1, 1, 11);
        SpectrumSet Motion(string point, Complex x, Complex z) => new(
            axis, [new Dof(point, Direction.Z), new Dof(point, Direction.X)], [Enumerable.Repeat(z, 11).ToArray(), Enumerable.Repeat(x, 11).ToArray()]);
        RouteForces route = ContactForceRoutes.ThroughMounts([new MountPath(mount, "s", "r")], Motion("s", 4, 2), Motion("r", 1, 1));
        Assert.Equal([Dof.Parse("r.x"), Dof.Parse("r.z")], route.Forces.Dofs);
        Assert.All(route.Forces.Values[0], value => Near.Equal(new Complex(10, 5), value, 1e-14));
        Assert.All(route.Forces.Values[1], value => Near.Equal(new Complex(8, 4), value, 1e-14));
    }

    /// <summary>F₂ = −(k₂₁u₁ + k₂₂u₂), forces of ISO 10846 pointing into the mount at both ends.</summary>
    [Fact]
    public void ThroughMounts_MountWithMassEffect_GivesTheForceOnTheReceiver()
    {
        FrequencyAxis axis = FrequencyAxis.Even(1, 1, 9);
        StiffnessTable Table(Complex k) => new(Direction.X, axis, Enumerable.Repeat(k, 9).ToArray());
        var mount = new TwoPortMount([new TwoPortTable(Table(7), Table(new Complex(-5, -1)), Table(new Complex(-5, -1)), Table(6))]);
        SpectrumSet Motion(string dof, Complex value) => new(axis, [Dof.Parse(dof)], [Enumerable.Repeat(value, 9).ToArray()]);
        RouteForces route = ContactForceRoutes.ThroughMounts([new MountPath(mount, "s", "r")], Motion("s.x", 2), Motion("r.x", 1));
        Assert.All(route.Forces.Values[0], value => Near.Equal(new Complex(4, 2), value, 1e-14));
    }

    [Fact]
    public void ThroughMounts_MotionOfAPointMissing_NamesIt()
    {
        SpectrumSet motion = LumpedBench.One(LumpedBench.SourceInterface, [1, 1, 1]);
        var exception = Assert.Throws<ArgumentException>(
            () => ContactForceRoutes.ThroughMounts([new MountPath(LumpedBench.Mount, "2", "7")], motion, motion));
        Assert.Contains("7.x", exception.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Direct_MeasuredForces_AreContactForces() =>
        Assert.Equal(ForceNature.Contact, ContactForceRoutes.Direct(LumpedBench.One(LumpedBench.ReceiverInterface, [1, 1, 1])).Nature);
}
