using System.Numerics;
using Boltup.Engine;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Identification;
using Boltup.Engine.Spectra;
using Boltup.Tests.Support;

namespace Boltup.Tests.Engine.Identification;

public class RunAverageTests
{
    private readonly RandomBench _bench = new(sensors: 3, forces: 2, lines: 40);
    private readonly DiagnosticBag _diagnostics = new();

    [Fact]
    public void Of_RunsWithOnePhase_IsTheirMean()
    {
        SpectrumSet set = _bench.Measure(_bench.RandomForces(1));
        IReadOnlyList<SpectrumSet>? columns = RunAverage.Of([set, set, set], PhaseReference.Common, "run", null, _diagnostics);
        Near.Equal(set.Values[2], Assert.Single(columns!).Values[2], 1e-14);
        Assert.Equal(1, RunAverage.Agreement([set, set, set]), 1e-12);
    }

    [Theory]
    [InlineData(2)]
    [InlineData(5)]
    public void Of_RunsWithChancePhases_IsRefused(int count)
    {
        SpectrumSet set = _bench.Measure(_bench.RandomForces(1));
        SpectrumSet[] runs = [.. Enumerable.Range(0, count).Select(seed => Turned(set, seed))];
        Assert.Null(RunAverage.Of(runs, PhaseReference.Common, "run", null, _diagnostics));
        Assert.Equal(EngineCodes.NoCommonPhase, Assert.Single(_diagnostics.Items).Code);
        Assert.InRange(RunAverage.Agreement(runs), -0.4, 0.4);
    }

    /// <summary>Powers add: Σ u·uᴴ over the columns is the mean of the runs' own.</summary>
    [Fact]
    public void Of_RunsWithFreePhase_KeepsTheMeanOfTheirCrossSpectra()
    {
        SpectrumSet[] runs = [.. Enumerable.Range(0, 4).Select(seed => _bench.Measure(_bench.RandomForces(seed)))];
        IReadOnlyList<SpectrumSet> columns = RunAverage.Of(runs, PhaseReference.Free, "run", null, _diagnostics)!;
        Near.Equal(Cross(runs, 0, 2) / 4, Cross(columns, 0, 2), 1e-13);
    }

    [Fact]
    public void PrincipalComponents_OfCrossSpectra_AddUpToThem()
    {
        SpectrumSet[] mechanisms = [.. Enumerable.Range(0, 2).Select(seed => _bench.Measure(_bench.RandomForces(seed)))];
        var spectra = new TiledMatrix(_bench.Axis.Count, 3, 3);
        for (int i = 0; i < 9; i++)
        {
            (int row, int column) = Math.DivRem(i, 3);
            spectra.ScatterSpectrum(row, column, [.. Enumerable.Range(0, _bench.Axis.Count).Select(line => Cross(mechanisms, row, column, line))]);
        }

        IReadOnlyList<SpectrumSet> components = PrincipalComponents.Of(_bench.Axis, _bench.Sensors, spectra);
        for (int line = 0; line < _bench.Axis.Count; line++)
        {
            Near.Equal(Cross(mechanisms, 0, 1, line), Cross(components, 0, 1, line), 1e-12);
            Near.Equal(Cross(mechanisms, 2, 2, line), Cross(components, 2, 2, line), 1e-12);
        }
    }

    private static SpectrumSet Turned(SpectrumSet set, int seed)
    {
        var random = new Random(seed);
        Complex[] turns = [.. set.Values[0].Select(_ => Complex.FromPolarCoordinates(1, 2 * Math.PI * random.NextDouble()))];
        return set with { Values = [.. set.Values.Select(values => values.Zip(turns, (value, turn) => value * turn).ToArray())] };
    }

    private static Complex Cross(IReadOnlyList<SpectrumSet> columns, int row, int column, int line = 7) =>
        columns.Aggregate(Complex.Zero, (sum, set) => sum + set.Values[row][line] * Complex.Conjugate(set.Values[column][line]));
}
