using Boltup.Config.Planning;
using Boltup.Engine;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Identification;
using Boltup.Engine.Spectra;

namespace Boltup.Tests.Config.Planning;

public sealed class BenchPlannerTests : IDisposable
{
    private readonly BenchFolder _bench = new();

    public void Dispose() => _bench.Dispose();

    [Fact]
    public void Plan_SoundBench_NamesItsDofs()
    {
        using BenchPlan? plan = _bench.Plan();
        Assert.NotNull(plan);
        Assert.Empty(_bench.Diagnostics.Items);
        Assert.Equal([Dof.Parse("m1.z"), Dof.Parse("m2.z")], plan.Bench.Interface);
        Assert.Equal(3, plan.Bench.Indicators.Count);
        Assert.Equal([Dof.Parse("v1.z")], plan.Bench.Validation);
        Assert.Equal(4, plan.Bench.Axis.Count);
        Assert.Equal(3, plan.Inputs.Count);
    }

    [Fact]
    public void Plan_FewerIndicatorsThanForces_IsAnError()
    {
        _bench.Replace("[s1, s2, s3]", "[s1]");
        Expect(PlanCodes.FewIndicators, "1 indicator dofs cannot tell 2 forces apart");
    }

    [Fact]
    public void Plan_AsManyIndicatorsAsForces_IsAWarning()
    {
        _bench.Replace("[s1, s2, s3]", "[s1, s2]");
        using BenchPlan? plan = _bench.Plan();
        Assert.NotNull(plan);
        Assert.Equal((PlanCodes.NotOverDetermined, Severity.Warning), (_bench.Worst().Code, _bench.Worst().Severity));
    }

    [Fact]
    public void Plan_NoValidation_IsAWarning()
    {
        _bench.Replace("validation: [v1]", "validation: ~");
        _bench.Replace("validation: ~\n", "");
        using BenchPlan? plan = _bench.Plan();
        Assert.NotNull(plan);
        Assert.Equal(EngineCodes.NoValidation, _bench.Worst().Code);
    }

    [Fact]
    public void Plan_InterfaceDofWithoutFrfs_IsAnErrorThatNamesIt()
    {
        _bench.Write("frf.csv", BenchFolder.FrfTable(["s1.z", "s2.z", "s3.z", "v1.z"], ["m1.z"]));
        Expect(PlanCodes.ForceWithoutFrf, "`m2.z`");
    }

    [Fact]
    public void Plan_SensorWithoutFrfs_IsAnErrorThatNamesIt()
    {
        _bench.Write("frf.csv", BenchFolder.FrfTable(["s1.z", "s2.z", "v1.z"], ["m1.z", "m2.z"]));
        Expect(PlanCodes.SensorWithoutFrf, "`s3`");
    }

    [Fact]
    public void Plan_AxesThatDiffer_AreAnError()
    {
        _bench.Write("run.csv", BenchFolder.SpectrumTable(["s1.z", "s2.z", "s3.z", "v1.z"], 5).Replace("0,", "5,", StringComparison.Ordinal));
        Expect(EngineCodes.NoCommonAxis, "operation `run`");
    }

    [Fact]
    public void Plan_OperationFromOtherSensors_IsAnErrorThatSaysWhatTheFileHolds()
    {
        _bench.Write("run.csv", BenchFolder.SpectrumTable(["s1.x", "s2.x", "s3.x", "v1.x"], 5));
        Expect(PlanCodes.OtherSensors, "no spectrum of any sensor");
        Assert.Contains("s1.x", Assert.Single(_bench.Worst().Notes), StringComparison.Ordinal);
    }

    [Fact]
    public void Plan_NumberThatIsNone_IsAnErrorWithItsLine()
    {
        string table = BenchFolder.SpectrumTable(["s1.z", "s2.z", "s3.z", "v1.z"], 5);
        int at = table.IndexOf("s2.z,120,", StringComparison.Ordinal) + "s2.z,120,".Length;
        _bench.Write("run.csv", table[..at] + "NaN" + table[table.IndexOf(',', at)..]);
        Expect(EngineCodes.NotFinite, "120 Hz");
    }

    [Fact]
    public void Plan_QuantityOfCsvUnsaid_IsAnError()
    {
        _bench.Replace(", quantity: acceleration", "");
        Expect(PlanCodes.QuantityUnknown, "acceleration, velocity or displacement");
    }

    [Fact]
    public void Plan_RunsWithChancePhases_AreRefused()
    {
        _bench.Write("run2.csv", BenchFolder.SpectrumTable(["s1.z", "s2.z", "s3.z", "v1.z"], 6).Replace(",0.", ",-0.", StringComparison.Ordinal));
        _bench.Replace("file: run.csv, quantity", "runs: [run.csv, run2.csv], phase: common, quantity");
        Expect(EngineCodes.NoCommonPhase, "2 runs have no common phase");
    }

    [Fact]
    public void Plan_RunsWithFreePhase_BecomeColumns()
    {
        _bench.Write("run2.csv", BenchFolder.SpectrumTable(["s1.z", "s2.z", "s3.z", "v1.z"], 6));
        _bench.Replace("file: run.csv, quantity", "runs: [run.csv, run2.csv], phase: free, quantity");
        using BenchPlan? plan = _bench.Plan();
        Assert.NotNull(plan);
        Assert.Equal((PhaseReference.Free, 2), (plan.Bench.Operations[0].Phase, plan.Bench.Operations[0].Columns.Count));
        Assert.Equal(EngineCodes.FewRuns, Assert.Single(_bench.Diagnostics.Items).Code);
    }

    /// <summary>Either half of the matrix is enough, and the columns add up to it.</summary>
    [Theory]
    [InlineData(false)]
    [InlineData(true)]
    public void Plan_CrossSpectra_BecomeColumnsThatAddUpToThem(bool isUpperHalf)
    {
        _bench.Write("cross.csv", BenchFolder.CrossTable((row, column) => isUpperHalf ? column >= row : column <= row, 1, 2));
        _bench.Replace("file: run.csv", "cross_spectra: cross.csv");
        using BenchPlan? plan = _bench.Plan();
        Assert.NotNull(plan);
        BenchOperation operation = plan.Bench.Operations[0];
        Assert.Equal(PhaseReference.Free, operation.Phase);
        Assert.All(SpectralRank.Of(operation.Columns), rank => Assert.Equal(2, rank));
        IdentificationResult result = Identifier.Run(plan.Bench, new DiagnosticBag())!;
        Assert.All(SpectralRank.Of(result.Operations[0].Forces), rank => Assert.InRange(rank, 1, 2));
    }

    [Fact]
    public void Plan_CrossSpectraThatAreNotHermitian_AreAnError()
    {
        string table = BenchFolder.CrossTable((_, _) => true, 1);
        int at = table.IndexOf("s1.z,s2.z,110,", StringComparison.Ordinal) + "s1.z,s2.z,110,".Length;
        _bench.Write("cross.csv", table[..at] + "7" + table[table.IndexOf(',', at)..]);
        _bench.Replace("file: run.csv", "cross_spectra: cross.csv");
        Expect(EngineCodes.SpectraNotHermitian, "`s1.z` and `s2.z` do not fit each other or their auto spectra at 110 Hz");
    }

    [Fact]
    public void Plan_NegativeAutoSpectrum_IsAnError()
    {
        string table = BenchFolder.CrossTable((_, _) => true, 1);
        int at = table.IndexOf("s3.z,s3.z,120,", StringComparison.Ordinal) + "s3.z,s3.z,120,".Length;
        _bench.Write("cross.csv", table[..at] + "-" + table[at..]);
        _bench.Replace("file: run.csv", "cross_spectra: cross.csv");
        Expect(EngineCodes.SpectraNotHermitian, "120 Hz");
    }

    [Fact]
    public void Plan_MissingCrossSpectrum_IsAnErrorThatNamesThePair()
    {
        _bench.Write("cross.csv", BenchFolder.CrossTable((row, column) => row + column != 1, 1));
        _bench.Replace("file: run.csv", "cross_spectra: cross.csv");
        Expect(PlanCodes.OtherSensors, "lacks 2 of 16");
    }

    private void Expect(DiagnosticCode code, string words)
    {
        using BenchPlan? plan = _bench.Plan();
        Assert.Null(plan);
        Diagnostic error = _bench.Worst();
        Assert.Equal((code, Severity.Error), (error.Code, error.Severity));
        Assert.Contains(words, error.Message, StringComparison.Ordinal);
    }
}
