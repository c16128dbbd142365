using System.Numerics;
using Boltup.Engine.Evidence;
using Boltup.Engine.Spectra;
using Boltup.Tests.Support;

namespace Boltup.Tests.Engine.Evidence;

public class ValidationComparisonTests
{
    private static readonly FrequencyAxis Axis = FrequencyAxis.FromHertz([10, 20, 30]);
    private static readonly Dof[] Two = [Dof.Parse("v.x"), Dof.Parse("v.z")];
    private static readonly Complex[][] Measured = [[new(1, 2), new(-3, 0), new(0, 1)], [new(2, 0), new(1, 1), new(4, 0)]];

    [Fact]
    public void Compare_Equal_IsPerfect()
    {
        ValidationReport report = Compare(Measured);
        Assert.All(report.Consistency, value => Assert.Equal(1, value, 14));
        Assert.All(report.LevelDifferenceDb.Append(report.OverallLevelDifferenceDb), value => Assert.Equal(0, value, 12));
        Assert.Equal((0, 0), (report.RelativeError, report.Dofs[1].RelativeError));
    }

    /// <summary>The consistency figure cannot see a common factor; the level difference does.</summary>
    [Fact]
    public void Compare_CommonFactor_IsConsistentButOff()
    {
        ValidationReport report = Compare(Times(Measured, new Complex(0, 2), new Complex(0, 2)));
        Assert.All(report.Consistency, value => Assert.Equal(1, value, 14));
        Assert.All(report.LevelDifferenceDb, value => Assert.Equal(20 * Math.Log10(2), value, 12));
        Assert.All(report.Dofs.SelectMany(dof => dof.DifferenceDb), value => Assert.Equal(20 * Math.Log10(2), value, 12));
        Assert.Equal(Math.Sqrt(5), report.RelativeError, 12);
    }

    [Fact]
    public void Compare_OneDofTurnedRound_LosesConsistencyAndKeepsLevel()
    {
        ValidationReport report = Compare(Times(Measured, 1, -1));
        for (int line = 0; line < 3; line++)
        {
            (double x, double z) = (Math.Pow(Complex.Abs(Measured[0][line]), 2), Math.Pow(Complex.Abs(Measured[1][line]), 2));
            Assert.Equal(Math.Pow((x - z) / (x + z), 2), report.Consistency[line], 12);
            Assert.Equal(0, report.LevelDifferenceDb[line], 12);
        }

        Assert.Equal(2, report.Dofs[1].RelativeError, 12);
    }

    /// <summary>A sound pressure in Pa beside motion in m/s² must not drown it.</summary>
    [Fact]
    public void Compare_MotionBesideSound_CountsEachKindByItsOwnSize()
    {
        Dof[] dofs = [Dof.Parse("v.x"), Dof.Parse("ear.p")];
        SpectrumSet measured = new(Axis, dofs, [[1, 1, 1], [1e-3, 1e-3, 1e-3]]);
        SpectrumSet predicted = new(Axis, dofs, [[1, 1, 1], [2e-3, 2e-3, 2e-3]]);
        ValidationReport report = ValidationComparison.Compare(ValidationCheck.Transfer, predicted, measured);
        Assert.Equal(Math.Sqrt(0.5), report.RelativeError, 12);
        Assert.Equal(10 * Math.Log10(2.5), report.OverallLevelDifferenceDb, 12);
    }

    [Fact]
    public void Compare_ZeroMeasured_IsAGap()
    {
        ValidationReport report = ValidationComparison.Compare(
            ValidationCheck.OnBoard, new SpectrumSet(Axis, Two[..1], [[1, 1, 1]]), new SpectrumSet(Axis, Two[..1], [[1, 0, 2]]));
        Assert.Equal([0, double.NaN, -20 * Math.Log10(2)], report.Dofs[0].DifferenceDb);
        Assert.All(report.Consistency, value => Assert.True(double.IsNaN(value), "one dof has no pattern"));
        Assert.True(double.IsNaN(report.MeanConsistency));
    }

    [Theory]
    [InlineData(ValidationCheck.OnBoard, "share the dynamics of the bench")]
    [InlineData(ValidationCheck.Transfer, "another installation")]
    public void Statement_OfEitherCheck_SaysWhatItCannotShow(ValidationCheck check, string expected) =>
        Assert.Contains(expected, ValidationComparison.Compare(check, Set(Measured), Set(Measured)).Statement, StringComparison.Ordinal);

    [Theory]
    [InlineData("clean", 1e-5)]
    [InlineData("noisy", 5e-3)]
    public void Compare_ReferenceBench_AgreesOnBoard(string quality, double tolerance)
    {
        string frfs = $"bench_insitu_{quality}.unv";
        string operation = $"bench_operation_{quality}.unv";
        SpectrumSet forces = LeastSquares.Forces(
            BenchData.Frf(frfs, BenchData.Indicators, BenchData.Interface), BenchData.Spectra(operation, BenchData.Indicators));
        SpectrumSet predicted = ResponsePrediction.Of(BenchData.Frf(frfs, BenchData.Validation, BenchData.Interface), forces);
        ValidationReport report = ValidationComparison.Compare(
            ValidationCheck.OnBoard, predicted, BenchData.Spectra(operation, BenchData.Validation));
        Assert.InRange(report.RelativeError, 0, tolerance);
        Assert.InRange(report.MeanConsistency, 0.999, 1);
        Assert.InRange(Math.Abs(report.OverallLevelDifferenceDb), 0, 0.02);
    }

    [Fact]
    public void Of_ForcesAtOtherDofs_IsRefused() => Assert.Throws<ArgumentException>(() => ResponsePrediction.Of(
        LumpedBench.Frf(LumpedBench.Source, LumpedBench.SourceInterface), LumpedBench.One(LumpedBench.SourceInside, LumpedBench.BlockedForce)));

    private static ValidationReport Compare(Complex[][] predicted) =>
        ValidationComparison.Compare(ValidationCheck.OnBoard, Set(predicted), Set(Measured));

    private static SpectrumSet Set(Complex[][] values) => new(Axis, Two, values);

    private static Complex[][] Times(Complex[][] values, params Complex[] factors) =>
        [.. values.Select((spectrum, i) => spectrum.Select(value => value * factors[i]).ToArray())];
}
