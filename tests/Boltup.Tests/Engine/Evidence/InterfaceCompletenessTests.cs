using Boltup.Engine;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Evidence;
using Boltup.Engine.Spectra;

namespace Boltup.Tests.Engine.Evidence;

/// <summary>Exact lumped models: nothing passes from source to receiver but over the interface masses.</summary>
public class InterfaceCompletenessTests
{
    [Fact]
    public void Check_WholeInterface_IsComplete()
    {
        FrfAgreement agreement = Check(InstalledLattice.Interface).Agreement;
        Assert.All(agreement.Consistency, value => Assert.Equal(1, value, 10));
        Assert.All(agreement.LevelDifferenceDb, value => Assert.Equal(0, value, 8));
        Assert.InRange(agreement.RelativeError, 0, 1e-10);
    }

    [Fact]
    public void Check_DofLeftOut_IsIncomplete()
    {
        FrfAgreement agreement = Check(InstalledLattice.Interface[..1]).Agreement;
        Assert.InRange(agreement.Consistency.Min(), 0, 0.8);
        Assert.True(agreement.RelativeError > 0.1);
    }

    /// <summary>The criterion cannot see a sensitivity that is wrong throughout; the level difference does.</summary>
    [Fact]
    public void Check_CommonScaleError_ShowsInTheLevelOnly()
    {
        FrfAgreement agreement = Check(InstalledLattice.Interface, scale: 2).Agreement;
        Assert.All(agreement.Consistency, value => Assert.Equal(1, value, 10));
        Assert.All(agreement.LevelDifferenceDb.Append(agreement.OverallLevelDifferenceDb), value => Assert.Equal(20 * Math.Log10(2), value, 8));
    }

    [Fact]
    public void Check_InterfaceNamedTwice_IsSingular()
    {
        Dof[] twice = [InstalledLattice.Interface[0], InstalledLattice.Interface[0]];
        var diagnostics = new DiagnosticBag();
        Assert.Null(Check(twice, 1, diagnostics));
        Assert.Equal(EngineCodes.SingularFrf, Assert.Single(diagnostics.Items).Code);
    }

    private static InterfaceCompleteness Check(Dof[] carriers, double scale = 1) => Check(carriers, scale, new DiagnosticBag())!;

    private static InterfaceCompleteness? Check(Dof[] carriers, double scale, DiagnosticBag diagnostics)
    {
        FrfMatrix toReceiver = InstalledLattice.Frf(InstalledLattice.Receiver, carriers);
        for (int tile = 0; tile < toReceiver.Values.TileCount; tile++)
        {
            foreach (ref double value in toReceiver.Values.Tile(tile))
            {
                value *= scale;
            }
        }

        return InterfaceCompleteness.Check(
            InstalledLattice.Frf(carriers, carriers),
            toReceiver,
            InstalledLattice.Frf(carriers, InstalledLattice.Source),
            InstalledLattice.Frf(InstalledLattice.Receiver, InstalledLattice.Source),
            diagnostics);
    }
}
