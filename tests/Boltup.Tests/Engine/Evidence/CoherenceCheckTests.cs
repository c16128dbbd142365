using System.Numerics;
using Boltup.Engine;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Evidence;
using Boltup.Engine.Spectra;
using Boltup.Tests.Support;

namespace Boltup.Tests.Engine.Evidence;

public class CoherenceCheckTests
{
    private static readonly FrequencyAxis Axis = FrequencyAxis.Even(10, 10, 20);

    [Fact]
    public void Check_ReferenceBench_DoubtsItsFirstLineOnly()
    {
        (CoherenceReport? report, IReadOnlyList<Diagnostic> said) =
            Check(BenchData.Frf("bench_insitu_coherence.unv", BenchData.Indicators, BenchData.Interface), 10);
        Assert.Equal(EngineCodes.LowCoherence, Assert.Single(said).Code);
        Assert.InRange(report!.Mean.Average(), 0.98, 1);
        Assert.True(report.Least.Min() < 0.5);
        Assert.Equal(new LineBand(20, 20, 1), Assert.Single(report.LowBands));
    }

    [Fact]
    public void Check_OneAverage_SaysThatItSaysNothing()
    {
        (CoherenceReport? report, IReadOnlyList<Diagnostic> said) = Check(Coherence((_, _) => 1), 1);
        Assert.Null(report);
        Assert.Equal(EngineCodes.OneAverage, Assert.Single(said).Code);
        Assert.Equal("bench: one average says nothing about coherence", said[0].Message);
    }

    [Theory]
    [InlineData(1.08, "1.08")]
    [InlineData(-0.2, "-0.2")]
    [InlineData(double.NaN, "NaN")]
    public void Check_ValueThatIsNoCoherence_NamesFrfAndLine(double value, string shown)
    {
        (CoherenceReport? report, IReadOnlyList<Diagnostic> said) = Check(Coherence((line, frf) => line == 3 && frf == 1 ? value : 0.9), 10);
        Assert.Null(report);
        Assert.Equal(EngineCodes.CoherenceOutOfRange, Assert.Single(said).Code);
        Assert.Equal($"bench: the coherence of `2.x` / `m.z` is {shown} at 40 Hz", said[0].Message);
    }

    [Fact]
    public void Check_RoundedPastOne_IsAccepted()
    {
        (CoherenceReport? report, IReadOnlyList<Diagnostic> said) = Check(Coherence((line, _) => line == 0 ? 0.5 : 1.000001), 10);
        Assert.DoesNotContain(said, item => item.Severity == Severity.Error);
        Assert.Equal(1, report!.Mean[5]);
    }

    [Fact]
    public void Check_LowBand_NamesItAndTheWeakestFrf()
    {
        (CoherenceReport? report, IReadOnlyList<Diagnostic> said) = Check(Coherence((line, frf) => line is >= 4 and < 8 ? 0.5 - 0.1 * frf : 0.95), 10);
        Assert.Equal(new LineBand(50, 80, 4), Assert.Single(report!.LowBands));
        Assert.Equal((0.4, 0.45), (report.Least[4], report.Mean[4]));
        Assert.Equal(EngineCodes.LowCoherence, Assert.Single(said).Code);
        Assert.Equal("bench: the mean coherence is below 0.8 at 4 of 20 lines", said[0].Message);
        Assert.Equal(["in 50 to 80 Hz", "least explained: `2.x / m.z` with a mean of 0.84"], said[0].Notes);
    }

    [Fact]
    public void Check_OneEverywhere_DoubtsTheAverages() =>
        Assert.Equal(EngineCodes.CoherenceAlwaysOne, Assert.Single(Check(Coherence((_, _) => 1), 10).Said).Code);

    private static (CoherenceReport? Report, IReadOnlyList<Diagnostic> Said) Check(FrfMatrix coherence, int averages)
    {
        var diagnostics = new DiagnosticBag();
        CoherenceReport? report = CoherenceCheck.Check("bench", new SourceSpan("bench.yaml", 3, 1), coherence, averages, diagnostics);
        return (report, diagnostics.Items);
    }

    private static FrfMatrix Coherence(Func<int, int, double> value)
    {
        var coherence = new FrfMatrix(Axis, [Dof.Parse("1.x"), Dof.Parse("2.x")], [Dof.Parse("m.z")]);
        for (int row = 0; row < 2; row++)
        {
            coherence.Values.ScatterSpectrum(row, 0, [.. Enumerable.Range(0, Axis.Count).Select(line => (Complex)value(line, row))]);
        }

        return coherence;
    }
}
