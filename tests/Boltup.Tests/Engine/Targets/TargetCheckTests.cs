using System.Numerics;
using Boltup.Engine;
using Boltup.Engine.Acoustics;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;
using Boltup.Engine.Targets;

namespace Boltup.Tests.Engine.Targets;

public class TargetCheckTests
{
    private readonly DiagnosticBag _diagnostics = new();

    /// <summary>Two tones of 1 Pa rms, at 125 Hz and at 1 kHz: 96.99 dB together, 94.09 dB(A) because A takes 16.1 dB off the lower one.</summary>
    [Theory]
    [InlineData(FrequencyWeighting.Z, 96.99)]
    [InlineData(FrequencyWeighting.A, 94.08)]
    public void Run_OverallLimit_JudgesTheWeightedSum(FrequencyWeighting weighting, double expected)
    {
        TargetVerdict verdict = Judge(new Target("t", "ear", [], weighting, null, null, [new TargetLimit(null, 95)]));
        Assert.Equal(expected, verdict.LevelDb, 0.02);
        Assert.Equal(95 - verdict.LevelDb, verdict.MarginDb, 1e-12);
        Assert.Equal(expected > 95, verdict.IsMissed);
    }

    [Fact]
    public void Run_BandLimits_FindsTheBandThatDecides()
    {
        TargetVerdict verdict = Judge(new Target(
            "t", "ear", [], FrequencyWeighting.Z, null, null, [new TargetLimit(OctaveBand.Of(1000), 100), new TargetLimit(OctaveBand.Of(125), 90)]));
        Assert.Equal(OctaveBand.Of(125), verdict.Band);
        Assert.Equal(93.98, verdict.LevelDb, 0.01);
        Assert.True(verdict.IsMissed);
    }

    [Fact]
    public void Run_FromAndTo_LeaveTheRestOut()
    {
        TargetVerdict verdict = Judge(new Target("t", "ear", [], FrequencyWeighting.Z, 500, 2000, [new TargetLimit(null, 95)]));
        Assert.Equal(93.98, verdict.LevelDb, 0.01);
    }

    /// <summary>Peak values of a sine are √2 times the rms value: 3.01 dB.</summary>
    [Fact]
    public void Run_PeakLines_CountWithTheirRms() => Assert.Equal(
        96.99 - 3.01, Judge(new Target("t", "ear", [], FrequencyWeighting.Z, null, null, [new TargetLimit(null, 95)]), Amplitude.Peak).LevelDb, 0.02);

    [Fact]
    public void Run_OtherOperation_IsNotJudged() =>
        Assert.Empty(TargetCheck.Run([new Target("t", "ear", ["idle"], FrequencyWeighting.Z, null, null, [new TargetLimit(null, 95)])], [Operation(Amplitude.Rms)], _diagnostics));

    [Fact]
    public void Run_BandWithoutLines_IsNeitherMetNorMissed()
    {
        TargetVerdict verdict = Judge(new Target("t", "ear", [], FrequencyWeighting.Z, 3000, 4000, [new TargetLimit(null, 95)]));
        Assert.False(verdict.IsJudged);
        Assert.False(verdict.IsMissed);
        Assert.Equal(EngineCodes.TargetOutsideBand, Assert.Single(_diagnostics.Items).Code);
    }

    [Fact]
    public void Run_BandOfFewLines_WarnsAndNamesIt()
    {
        Judge(new Target(
            "t", "ear", [], FrequencyWeighting.Z, null, null, [new TargetLimit(OctaveBand.Of(125), 100), new TargetLimit(OctaveBand.Of(1000), 100)]));
        Diagnostic warning = Assert.Single(_diagnostics.Items);
        Assert.Equal(EngineCodes.FewLinesInBand, warning.Code);
        Assert.EndsWith(": 125 Hz", warning.Message, StringComparison.Ordinal);
    }

    private TargetVerdict Judge(Target target, Amplitude amplitude = Amplitude.Rms) =>
        Assert.Single(TargetCheck.Run([target], [Operation(amplitude)], _diagnostics));

    private static OperationResult Operation(Amplitude amplitude)
    {
        FrequencyAxis axis = FrequencyAxis.Even(25, 25, 80);
        var values = new Complex[axis.Count];
        values[axis.IndexOf(125)] = Complex.ImaginaryOne;
        values[axis.IndexOf(1000)] = -1;
        return new OperationResult("run", axis, amplitude, [new ResponseSpectrum("ear", "body.ear.p", Quantity.Pressure, "Pa", values)], []);
    }
}
