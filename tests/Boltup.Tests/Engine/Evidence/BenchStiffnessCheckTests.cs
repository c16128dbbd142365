using System.Numerics;
using Boltup.Engine;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Evidence;
using Boltup.Engine.Mounts;
using Boltup.Engine.Parts;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;
using Boltup.Tests.Support;

namespace Boltup.Tests.Engine.Evidence;

public class BenchStiffnessCheckTests
{
    /// <summary>The bench is stored in single precision.</summary>
    private const double SinglePrecision = 1e-4;

    private static readonly SpectrumSet Blocked = BenchData.Spectra("blocked_forces_true.csv", BenchData.Interface);
    private static readonly SpectrumSet Contact = BenchData.Spectra("bench_contact_true.csv", BenchData.BenchSide);

    private static readonly Lazy<TiledMatrix> Transfer = new(() => ContactTransfer.FromFreeParts(
        BenchData.FreeCompressor(),
        BenchData.Frf("bench_free.unv", BenchData.BenchSide, BenchData.BenchSide),
        BenchMounts.All,
        new DiagnosticBag())!);

    [Fact]
    public void FromFreeParts_ReferenceBench_PredictsTheTrueContactForces()
    {
        SpectrumSet found = ContactTransfer.ContactForces(Transfer.Value, Blocked);
        for (int dof = 0; dof < 12; dof++)
        {
            Near.Equal(Contact.Values[dof], found.Values[dof], SinglePrecision);
        }
    }

    [Fact]
    public void FromTransfer_ReferenceBench_SaysTheSameAsTheTrueForces()
    {
        BenchStiffness predicted = BenchStiffnessCheck.FromTransfer(Transfer.Value, Blocked);
        BenchStiffness truth = BenchStiffnessCheck.FromForces(Contact, Blocked);
        for (int line = 0; line < truth.Axis.Count; line++)
        {
            Assert.Equal(truth.OverallRatioDb[line], predicted.OverallRatioDb[line], 2);
            Assert.Equal(truth.Dofs[5].RatioDb[line], predicted.Dofs[5].RatioDb[line], 1);
        }

        Assert.Equal(truth.TotalDifference, predicted.TotalDifference, 3);
    }

    [Fact]
    public void FromForces_MountedReferenceBench_IsFarFromBlocked()
    {
        BenchStiffness truth = BenchStiffnessCheck.FromForces(Contact, Blocked);
        Assert.True(truth.TotalDifference > 0.4);
        Assert.Null(truth.AllDofsAgreeUpToHz(1));
        Assert.All(truth.Dofs, dof => Assert.Empty(dof.MobilityRatio));
    }

    [Fact]
    public void FromInstalled_LumpedChain_GivesTheTransferOfTheFreeParts()
    {
        var diagnostics = new DiagnosticBag();
        FrfMatrix source = LumpedBench.Frf(LumpedBench.Source, LumpedBench.SourceInterface);
        FrfMatrix bench = LumpedBench.Frf(LumpedBench.Receiver, LumpedBench.ReceiverInterface);
        MountPath[] mounts = [new MountPath(LumpedBench.Mount, "2", "1")];
        TiledMatrix free = ContactTransfer.FromFreeParts(source, bench, mounts, diagnostics)!;
        FrfMatrix installed = Installed();
        Near.Equal(free.GatherSpectrum(0, 0), ContactTransfer.FromInstalledAndBench(installed, bench, mounts, diagnostics)!.GatherSpectrum(0, 0), 1e-12);
        Near.Equal(free.GatherSpectrum(0, 0), ContactTransfer.FromInstalledAndSource(installed, source, diagnostics)!.GatherSpectrum(0, 0), 1e-12);
        Near.Equal(
            LumpedBench.Run(LumpedBench.Resilient).JointForce(),
            ContactTransfer.ContactForces(free, LumpedBench.One(LumpedBench.SourceInterface, LumpedBench.BlockedForce)).Values[0],
            LumpedBench.PrintedDigits);
    }

    /// <summary>Mass against mass: T = m_R/(m_S + m_R) and Y_S/Y_R = m_R/m_S at every frequency.</summary>
    [Fact]
    public void FromTransfer_MassOnMass_HasTheRatioOfTheMasses()
    {
        FrequencyAxis axis = FrequencyAxis.Even(10, 10, 12);
        BenchStiffness found = OneDof(axis, Chain.Part("s", [2], []), Chain.Part("r", [14], []));
        Assert.All(found.OverallRatioDb, ratio => Assert.Equal(20 * Math.Log10(14.0 / 16), ratio, 10));
        Assert.All(found.RelativeDifference, difference => Assert.Equal(2.0 / 16, difference, 10));
        Assert.Equal(2.0 / 16, found.TotalDifference, 10);
        Assert.All(found.Dofs[0].MobilityRatio, ratio => Near.Equal(7, ratio, 1e-9));
        Assert.Equal([null, 120.0, 120.0], found.Agreement.Select(limit => limit.UpToHz));
        Assert.Equal(120, found.AllDofsAgreeUpToHz(3));
        Assert.Equal(
            "contact forces on the bench differ from the blocked forces by 12.5 % (2-norm over all lines, phase included); their levels agree within 1 dB nowhere from the lowest line on, within 3 dB up to 120 Hz, within 10 dB up to 120 Hz",
            found.Statement);
    }

    /// <summary>
    /// A mass m against a spring k: Y_S/Y_R = −k/(ω²m), which is −1 at 100 Hz; within 0.5 of −1 while (100 Hz/f)² is between 0.5 and 1.5.
    /// The ratio of the forces, 1/(1 − (f/100 Hz)²), leaves 1, 3 and 10 dB at 33, 54 and 83 Hz.
    /// </summary>
    [Fact]
    public void FromTransfer_MassOnSpring_IsStiffBelowTheResonanceAndCouplesStronglyAroundIt()
    {
        FrequencyAxis axis = FrequencyAxis.Even(10, 1, 200);
        double stiffness = Math.Pow(2 * Math.PI * 100, 2);
        BenchStiffness found = OneDof(axis, Chain.Part("s", [1], []), Chain.Part("r", [1e-9], [], 1e-4, (1, stiffness)));
        Assert.Equal([32.0, 54, 82], found.Agreement.Select(limit => limit.UpToHz!.Value));
        LineBand strong = Assert.Single(found.Dofs[0].StrongCoupling);
        Assert.Equal((82, 141), (strong.FromHz, strong.ToHz));
        Assert.Equal(60, strong.Lines);
    }

    [Fact]
    public void FromForces_MomentsBesideForces_CountForcesOnlyInTheOverallFigure()
    {
        FrequencyAxis axis = FrequencyAxis.FromHertz([10]);
        Dof[] dofs = [Dof.Parse("1.z"), Dof.Parse("1.rx")];
        BenchStiffness found = BenchStiffnessCheck.FromForces(
            new SpectrumSet(axis, dofs, [[new Complex(0, 2)], [100]]), new SpectrumSet(axis, dofs, [[2], [0]]));
        Assert.Equal(0, found.OverallRatioDb[0], 12);
        Assert.Equal(Math.Sqrt(2), found.RelativeDifference[0], 12);
        Assert.True(double.IsNaN(found.Dofs[1].RatioDb[0]));
        Assert.Null(found.Dofs[1].Agreement[2].UpToHz);
    }

    [Fact]
    public void FromFreeParts_DirectionThatTheMountDoesNotCarry_IsRefused()
    {
        FrfMatrix frf = LumpedBench.Frf(LumpedBench.Source, LumpedBench.SourceInterface);
        var across = new DiagonalMount([new SpringDamper(Direction.Y, 1e6, 0, 0)]);
        Assert.Throws<ArgumentException>(() => ContactTransfer.FromFreeParts(frf, frf, [new MountPath(across, "2", "2")], new DiagnosticBag()));
    }

    private static BenchStiffness OneDof(FrequencyAxis axis, PlacedPart source, PlacedPart bench)
    {
        Dof[] dof = [Dof.Parse("1.x")];
        TiledMatrix transfer = ContactTransfer.FromFreeParts(
            LumpedBench.Frf(source, dof, dof, axis), LumpedBench.Frf(bench, dof, dof, axis), [], new DiagnosticBag())!;
        return BenchStiffnessCheck.FromTransfer(axis, dof, transfer);
    }

    private static FrfMatrix Installed()
    {
        var result = new FrfMatrix(LumpedBench.Axis, [LumpedBench.SourceInterface], [LumpedBench.SourceInterface]);
        Complex[] coupled = Chain.Predict(
            LumpedBench.Axis,
            [LumpedBench.Source, LumpedBench.Receiver],
            [LumpedBench.Resilient],
            [Chain.Force(ForceKind.Applied, LumpedBench.Axis, Chain.End("A", 2), 1)],
            Chain.At(Chain.End("A", 2))).Spectrum();
        result.Values.ScatterSpectrum(0, 0, coupled);
        return result;
    }
}
