using System.Numerics;
using Boltup.Engine;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Identification;
using Boltup.Engine.Spectra;
using Boltup.Tests.Support;

namespace Boltup.Tests.Engine.Identification;

public class IdentifierTests
{
    /// <summary>Random tall matrices are well conditioned, so exact data give the forces to some ten digits.</summary>
    private const double Exact = 1e-11;

    private readonly RandomBench _bench = new(sensors: 14, forces: 4, lines: 21);
    private readonly DiagnosticBag _diagnostics = new();

    public static TheoryData<SolveChoice> Choices =>
    [
        SolveChoice.Plain,
        new SolveChoice(SolveMethod.Truncated, Threshold: 1e-9),
        new SolveChoice(SolveMethod.Tikhonov, Damping: 1e-9),
        new SolveChoice(SolveMethod.Tikhonov, Rule: DampingRule.CrossValidation),
        new SolveChoice(SolveMethod.Tikhonov, Rule: DampingRule.LCurve),
    ];

    [Theory]
    [MemberData(nameof(Choices))]
    public void Run_ExactData_FindsTheForcesAndPredictsTheValidation(SolveChoice choice)
    {
        SpectrumSet first = _bench.RandomForces(2), second = _bench.RandomForces(3);
        IdentificationResult result = Identify(_bench.Model(
            10, choice, RandomBench.Operation("first", _bench.Measure(first)), RandomBench.Operation("second", _bench.Measure(second))));

        // The L-curve of data without noise has no corner; where it stops is far below what matters in practice.
        double tolerance = choice.Rule == DampingRule.LCurve ? 1e-4 : Exact;
        AssertNear(first, result.Operations[0].Forces[0], tolerance);
        AssertNear(second, result.Operations[1].Forces[0], tolerance);
        AssertNear(result.Operations[1].Measured[0], result.Operations[1].Predicted[0], tolerance);
        Assert.Equal(4, result.Operations[1].Predicted[0].Dofs.Count);
    }

    [Fact]
    public void Run_ColumnsWithoutCommonPhase_GiveTheCrossSpectraOfTheForces()
    {
        SpectrumSet[] mechanisms = [_bench.RandomForces(2), _bench.RandomForces(3)];
        IdentificationResult result = Identify(_bench.Model(14, SolveChoice.Plain, RandomBench.Operation("free", [.. mechanisms.Select(_bench.Measure)])));

        IdentifiedOperation operation = result.Operations[0];
        for (int line = 0; line < _bench.Axis.Count; line++)
        {
            Complex expected = mechanisms.Aggregate(Complex.Zero, (sum, f) => sum + f.Values[0][line] * Complex.Conjugate(f.Values[3][line]));
            Near.Equal(expected, operation.CrossSpectrum(0, 3, line), 1e-9);
        }

        Assert.All(SpectralRank.Of(operation.Forces), rank => Assert.Equal(2, rank));
    }

    [Fact]
    public void Run_TwoForcesWithTheSameFrfs_IsRefusedUnlessTruncated()
    {
        foreach (Dof sensor in _bench.Sensors)
        {
            _bench[sensor, _bench.Interface[1]] = _bench[sensor, _bench.Interface[0]];
        }

        BenchOperation operation = RandomBench.Operation("run", _bench.Measure(_bench.RandomForces(2)));
        Assert.Null(Identifier.Run(_bench.Model(10, SolveChoice.Plain, operation), _diagnostics));
        Diagnostic error = Assert.Single(_diagnostics.Items);
        Assert.Equal(EngineCodes.IndicatorRankLost, error.Code);
        Assert.Equal(ErrorKind.UnsupportedByData, error.Code.Kind);

        IdentificationResult result = Identifier.Run(
            _bench.Model(10, new SolveChoice(SolveMethod.Truncated, Threshold: 1e-9), operation), new DiagnosticBag())!;
        AssertNear(result.Operations[0].Measured[0], result.Operations[0].Predicted[0], 1e-9);
        Assert.All(result.Operations[0].Lines, line => Assert.Equal(3, line.Kept));
    }

    [Fact]
    public void Run_SingularValues_AreSortedAndGiveTheCondition()
    {
        IdentificationResult result = Identify(_bench.Model(10, SolveChoice.Plain, RandomBench.Operation("run", _bench.Measure(_bench.RandomForces(2)))));
        SingularSpectrum values = result.SingularValues;
        for (int line = 0; line < _bench.Axis.Count; line++)
        {
            Assert.True(Enumerable.Range(1, 3).All(i => values.Values[i][line] <= values.Values[i - 1][line]));
            Assert.Equal(values.Values[0][line] / values.Values[3][line], values.Condition(line), 1e-12);
        }
    }

    [Fact]
    public void Run_SeveralRuns_KeepTheirScatter()
    {
        SpectrumSet forces = _bench.RandomForces(2);
        SpectrumSet[] runs = [_bench.Measure(Scaled(forces, 0.9)), _bench.Measure(forces), _bench.Measure(Scaled(forces, 1.1))];
        IReadOnlyList<SpectrumSet> mean = RunAverage.Of(runs, PhaseReference.Common, "run", null, _diagnostics)!;
        IdentificationResult result = Identify(_bench.Model(10, SolveChoice.Plain, RandomBench.Operation("run", [.. mean]) with { Runs = runs }));

        AssertNear(forces, result.Operations[0].Forces[0], Exact);
        // The deviation of 0.9, 1.0 and 1.1 with n − 1 = 2 is 0.1.
        Assert.Equal(0.1 * forces.Values[1][3].Magnitude, result.Operations[0].Scatter!.Values[1][3].Real, 1e-12);
    }

    private IdentificationResult Identify(BenchModel model)
    {
        IdentificationResult? result = Identifier.Run(model, _diagnostics);
        Assert.True(result is not null, string.Join("\n", _diagnostics.Items.Select(item => item.Message)));
        return result;
    }

    private static SpectrumSet Scaled(SpectrumSet set, double factor) =>
        set with { Values = [.. set.Values.Select(values => values.Select(value => factor * value).ToArray())] };

    private static void AssertNear(SpectrumSet expected, SpectrumSet actual, double tolerance)
    {
        Assert.Equal(expected.Dofs, actual.Dofs);
        Assert.All(expected.Values.Zip(actual.Values), pair => Near.Equal(pair.First, pair.Second, tolerance));
    }
}
