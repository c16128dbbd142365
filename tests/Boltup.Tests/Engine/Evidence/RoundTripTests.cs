using Boltup.Engine;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Evidence;
using Boltup.Engine.Spectra;

namespace Boltup.Tests.Engine.Evidence;

/// <summary>Exact lumped models: the estimate is the FRF that the model itself has at its interface.</summary>
public class RoundTripTests
{
    [Theory]
    [InlineData(2, 2)]
    [InlineData(2, 3)]
    [InlineData(3, 2)]
    [InlineData(3, 3)]
    public void Estimate_EnoughDofsOnEitherSide_GivesTheInterfaceFrfs(int onSource, int onReceiver)
    {
        FrfMatrix estimated = Estimate(onSource, onReceiver, new DiagnosticBag())!;
        Assert.Equal(InstalledLattice.Interface, estimated.Rows);
        FrfAgreement agreement = FrfAgreement.Of(estimated, InstalledLattice.Frf(InstalledLattice.Interface, InstalledLattice.Interface));
        Assert.InRange(agreement.RelativeError, 0, 1e-9);
        Assert.Equal(0, agreement.OverallLevelDifferenceDb, 8);
    }

    [Fact]
    public void Estimate_TooFewDofsOnTheReceiver_SaysSo()
    {
        var diagnostics = new DiagnosticBag();
        Assert.Null(Estimate(3, 1, diagnostics));
        Diagnostic error = Assert.Single(diagnostics.Items);
        Assert.Equal(EngineCodes.RoundTripTooShort, error.Code);
        Assert.Equal("a round trip over 2 interface dofs needs as many dofs on either side, found 3 on the source and 1 on the receiver", error.Message);
    }

    [Fact]
    public void Estimate_SourceDofNamedTwice_IsSingular()
    {
        Dof[] twice = [InstalledLattice.Source[1], InstalledLattice.Source[1]];
        var diagnostics = new DiagnosticBag();
        Assert.Null(Estimate(twice, InstalledLattice.Receiver, diagnostics));
        Assert.Equal(EngineCodes.SingularFrf, Assert.Single(diagnostics.Items).Code);
    }

    private static FrfMatrix? Estimate(int onSource, int onReceiver, DiagnosticBag diagnostics) =>
        Estimate(InstalledLattice.Source[..onSource], InstalledLattice.Receiver[..onReceiver], diagnostics);

    private static FrfMatrix? Estimate(Dof[] source, Dof[] receiver, DiagnosticBag diagnostics) => RoundTrip.Estimate(
        InstalledLattice.Frf(InstalledLattice.Interface, source),
        InstalledLattice.Frf(receiver, source),
        InstalledLattice.Frf(receiver, InstalledLattice.Interface),
        diagnostics);
}
