using System.Numerics;
using Boltup.Engine;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Evidence;
using Boltup.Engine.Spectra;
using Boltup.Tests.Support;

namespace Boltup.Tests.Engine.Evidence;

public class FreeVelocityRouteTests
{
    /// <summary>The compressor's FRFs are in single precision and badly conditioned where it moves as a rigid body.</summary>
    private const double SinglePrecision = 1e-3;

    [Fact]
    public void BlockedForces_LumpedSource_AreThoseOfTheTable()
    {
        FrfMatrix fromInside = LumpedBench.Frf(LumpedBench.Source, [LumpedBench.SourceInterface], [LumpedBench.SourceInside]);
        RouteForces route = FreeVelocityRoute.BlockedForces(
            LumpedBench.Frf(LumpedBench.Source, LumpedBench.SourceInterface),
            LumpedBench.One(LumpedBench.SourceInterface, fromInside.Values.GatherSpectrum(0, 0)),
            new DiagnosticBag())!;
        Assert.Equal((ForceRoute.FreeVelocity, ForceNature.Blocked), (route.Route, route.Nature));
        Near.Equal(LumpedBench.BlockedForce, route.Forces.Values[0], LumpedBench.PrintedDigits);
    }

    [Fact]
    public void BlockedForces_FreeCompressor_AreTheTrueOnes()
    {
        RouteForces route = FreeVelocityRoute.BlockedForces(
            BenchData.FreeCompressor(), BenchData.Spectra("free_acceleration_true.unv", BenchData.Interface), new DiagnosticBag())!;
        SpectrumSet truth = BenchData.Spectra("blocked_forces_true.csv", BenchData.Interface);
        for (int dof = 0; dof < truth.Dofs.Count; dof++)
        {
            Near.Equal(truth.Values[dof], route.Forces.Values[dof], SinglePrecision);
        }
    }

    [Fact]
    public void BlockedForces_DofsThatMoveAsOne_SaysTheFrfsAreSingular()
    {
        var frf = new FrfMatrix(LumpedBench.Axis, [Dof.Parse("1.x"), Dof.Parse("1.y")], [Dof.Parse("1.x"), Dof.Parse("1.y")]);
        for (int i = 0; i < 4; i++)
        {
            frf.Values.ScatterSpectrum(i / 2, i % 2, [1, 1, 1]);
        }

        var diagnostics = new DiagnosticBag();
        Assert.Null(FreeVelocityRoute.BlockedForces(frf, new SpectrumSet(LumpedBench.Axis, frf.Rows, [[1, 1, 1], new Complex[3]]), diagnostics));
        Diagnostic error = Assert.Single(diagnostics.Items);
        Assert.Equal(EngineCodes.SingularFrf, error.Code);
        Assert.Equal("the interface FRFs of the free source are singular at 10, 30 and 100 Hz", error.Message);
    }
}
