using System.Numerics;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.MountIdentification;
using Boltup.Engine.Prediction;
using Boltup.Tests.Support;

namespace Boltup.Tests.Engine.MountIdentification;

public class InverseSubstructuringTests
{
    private static readonly Lazy<InstalledMounts> Complete = new(() => InstalledCase.Measure(1, 2, 3, 4));

    /// <summary>The direct finite element data of both parts, coupled through known mounts: the mounts come back.</summary>
    [Fact]
    public void Identify_ReferenceCaseAtAllEnds_RecoversEveryMount()
    {
        var diagnostics = new DiagnosticBag();
        IReadOnlyList<IdentifiedMount> mounts = InverseSubstructuring.Identify(Complete.Value, diagnostics)!;
        for (int i = 0; i < 4; i++)
        {
            AssertStiffness(InstalledCase.Stiffness[i].X, mounts[i].Stiffness.Terms[0]);
            AssertStiffness(InstalledCase.Stiffness[i].Y, mounts[i].Stiffness.Terms[1]);
            AssertStiffness(InstalledCase.Stiffness[i].Z, mounts[i].Stiffness.Terms[2]);
        }

        Assert.Equal(["ENG124"], diagnostics.Items.Select(item => item.Code.Code));
    }

    [Fact]
    public void Identify_ReferenceCaseAtAllEnds_FindsNothingButTheMounts() => Assert.All(
        InverseSubstructuring.Identify(Complete.Value, new DiagnosticBag())!.SelectMany(mount => mount.Evidence),
        evidence =>
        {
            Assert.InRange(evidence.OtherMounts, 0, 1e-6);
            Assert.InRange(evidence.OtherDirections, 0, 1e-6);
            Assert.InRange(evidence.NotReciprocal, 0, 1e-6);
            Assert.True(evidence.OwnEndsAlone > 0.05, "one direction alone would be biased");
        });

    /// <summary>Two of four mounts: the others join the structures as well, which the numbers must show.</summary>
    [Fact]
    public void Identify_TwoOfFourMounts_IsBiasedAndSaysSo()
    {
        var diagnostics = new DiagnosticBag();
        IReadOnlyList<IdentifiedMount> mounts = InverseSubstructuring.Identify(InstalledCase.Measure(1, 2), diagnostics)!;
        Complex truth = InstalledCase.Stiffness[0].Z * new Complex(1, InstalledCase.LossFactor);
        double error = Near.RelativeError([.. mounts[0].Stiffness.Terms[2].Values.Select(_ => truth)], mounts[0].Stiffness.Terms[2].Values);
        Assert.True(error > 0.1, $"error {error}");
        Assert.Contains(diagnostics.Items, item => item.Code.Code == "ENG123");
    }

    [Fact]
    public void Identify_OneMountOfAChain_IsExactWithoutOtherMounts()
    {
        InstalledMounts installed = ChainInstallation.Measure(Chain.Mount(3e5, 0.1, 20));
        var diagnostics = new DiagnosticBag();
        IdentifiedMount mount = Assert.Single(InverseSubstructuring.Identify(installed, diagnostics)!);
        Near.Equal(
            [.. installed.Axis.Hz.ToArray().Select(hz => new Complex(3e5, 3e4 + 2 * Math.PI * hz * 20))], mount.Stiffness.Terms[0].Values, 1e-10);
        Assert.True(double.IsNaN(mount.Evidence[0].OtherMounts));
        Assert.True(double.IsNaN(mount.Evidence[0].OwnEndsAlone));
    }

    /// <summary>Of a mount with mass effect the method finds the transfer stiffness −k₂₁.</summary>
    [Fact]
    public void Identify_MountWithMassEffect_FindsItsTransferStiffness()
    {
        var rod = new Rod(4e5, 0.1, 0.06);
        InstalledMounts installed = ChainInstallation.Measure(rod.Mount(ChainInstallation.Axis));
        IdentifiedMount mount = Assert.Single(InverseSubstructuring.Identify(installed, new DiagnosticBag())!);
        Near.Equal([.. installed.Axis.Hz.ToArray().Select(hz => -rod.Terms(hz).Transfer)], mount.Stiffness.Terms[0].Values, 1e-10);
    }

    [Fact]
    public void Identify_TwoDofsThatMoveAsOne_IsRefused()
    {
        InstalledMounts installed = ChainInstallation.Measure(Chain.Mount(3e5, 0.1));
        for (int entry = 0; entry < 4; entry++)
        {
            installed.Receptance.ScatterSpectrum(entry / 2, entry % 2, installed.Receptance.GatherSpectrum(0, 0));
        }

        var diagnostics = new DiagnosticBag();
        Assert.Null(InverseSubstructuring.Identify(installed, diagnostics));
        Assert.Equal("ENG060", Assert.Single(diagnostics.Items).Code.Code);
    }

    private static void AssertStiffness(double expected, MountTerm found) =>
        Near.Equal([.. found.Values.Select(_ => expected * new Complex(1, InstalledCase.LossFactor))], found.Values, 1e-6);
}
