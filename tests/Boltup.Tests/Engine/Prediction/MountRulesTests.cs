using System.Numerics;
using Boltup.Engine.Coupling;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Mounts;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;
using Boltup.Tests.Support;

namespace Boltup.Tests.Engine.Prediction;

public class MountRulesTests
{
    private static readonly FrequencyAxis Axis = FrequencyAxis.Even(20, 1, 60);

    [Fact]
    public void Check_TableWithNegativeLoss_WarnsWithTheFrequencies()
    {
        Complex[] values = [.. Enumerable.Range(0, 60).Select(i => new Complex(1e5, i is 3 or 40 ? -500 : 1e3))];
        Diagnostic warning = Assert.Single(Judge(new TabledMount([new StiffnessTable(Direction.X, Axis, values)])));
        Assert.Equal(("ENG120", Severity.Warning), (warning.Code.Code, warning.Severity));
        Assert.Contains("23 and 60 Hz", warning.Message, StringComparison.Ordinal);
        Assert.Contains("-500 N/m", warning.Notes[0], StringComparison.Ordinal);
    }

    /// <summary>The eigenvalues of [[3, 4], [4, 3]] are 7 and −1: every diagonal entry dissipates, and the whole does not.</summary>
    [Fact]
    public void Offending_MatrixWithANegativeEigenvalue_IsFound()
    {
        MountLaw mount = Matrix(4);
        Assert.Equal(Axis.Count, MountPassivity.Offending(mount, Axis).Count);
        Assert.Equal(-0.1e5, MountPassivity.SmallestLoss(mount, Axis, 17), 1e-3);
        Assert.Empty(MountPassivity.Offending(Matrix(2.9), Axis));
    }

    [Fact]
    public void Offending_LosslessAndScaledMounts_AreNone()
    {
        Assert.Empty(MountPassivity.Offending(Chain.Mount(1e5, 0), Axis));
        Assert.Empty(MountPassivity.Offending(new ScaledMount(Chain.Mount(1e5, 0.1), 0.7), Axis));
        Assert.Empty(MountPassivity.Offending(new Rod(1e5, 0.2, 0.1).Mount(Axis), Axis));
    }

    [Fact]
    public void Check_TwoPortOfAnElementThatGivesPower_Warns() => Assert.Equal(
        ["ENG120"], Judge(new Rod(1e5, 0.2, -0.1).Mount(Axis)).Select(item => item.Code.Code));

    [Fact]
    public void Check_TwoPortWithoutMassEffect_IsAnError()
    {
        StiffnessTable Term(int sign) => new(Direction.X, Axis, [.. Enumerable.Repeat(sign * new Complex(1e5, 1e4), 60)]);
        Diagnostic error = Assert.Single(Judge(new TwoPortMount([new TwoPortTable(Term(1), Term(-1), Term(-1), Term(1))])));
        Assert.Equal(("ENG122", Severity.Error), (error.Code.Code, error.Severity));
    }

    [Theory]
    [InlineData(20, 1000, 0.12, true)]
    [InlineData(20, 150, 0.12, false)]
    [InlineData(20, 1000, 0.01, false)]
    public void Check_ConstantLossFactor_DrawsANoteOverDecades(double from, double to, double lossFactor, bool isSaid)
    {
        FrequencyAxis axis = FrequencyAxis.FromHertz([from, to]);
        Diagnostic[] found = Hints(Chain.Mount(1e5, lossFactor), axis);
        Assert.Equal(isSaid ? ["ENG121"] : [], found.Select(item => item.Code.Code));
        Assert.All(found, item => Assert.Equal(Severity.Note, item.Severity));
    }

    /// <summary>50^(2·0.12/π) − 1 = 0.348.</summary>
    [Fact]
    public void Check_ConstantLossFactor_SaysHowMuchACausalMaterialStiffens() => Assert.Contains(
        "about 35 %", Hints(Chain.Mount(1e5, 0.12), FrequencyAxis.FromHertz([20, 1000]))[0].Message, StringComparison.Ordinal);

    [Fact]
    public void Check_RelaxingMount_DrawsNothing() =>
        Assert.Empty(Hints(new RelaxingMount(Chain.Mount(1e5, 0), new Relaxation(3, 0.001, 0.5)), FrequencyAxis.FromHertz([20, 2000])));

    [Fact]
    public void Predict_ConstantLossFactorOverDecades_SaysNothing()
    {
        var diagnostics = new DiagnosticBag();
        Predictor.Predict(Assembly(Chain.Mount(1e5, 0.12), FrequencyAxis.FromHertz([20, 1000])), diagnostics);
        Assert.Empty(diagnostics.Items);
    }

    private static Diagnostic[] Judge(MountLaw mount)
    {
        var diagnostics = new DiagnosticBag();
        Predictor.Predict(Assembly(mount, Axis), diagnostics);
        return [.. diagnostics.Items];
    }

    private static Diagnostic[] Hints(MountLaw mount, FrequencyAxis axis)
    {
        var diagnostics = new DiagnosticBag();
        Predictor.Check(Assembly(mount, axis), diagnostics);
        return [.. diagnostics.Items];
    }

    private static AssemblyModel Assembly(MountLaw mount, FrequencyAxis axis)
    {
        JointEnd mass = Chain.End("mass", 1);
        ForceSet force = Chain.Force(ForceKind.Applied, axis, mass, 1);
        return new AssemblyModel(
            "mass on a mount",
            axis,
            [Chain.Part("mass", [1.0], [], 0)],
            [Chain.Through(mount, mass, JointEnd.Ground)],
            [new Operation("operation", ForceSum.Phase, Amplitude.Rms, [force])],
            []);
    }

    private static MatrixMount Matrix(double coupling) => new(
        [Direction.X, Direction.Y, Direction.Z],
        new double[,] { { 3e5, coupling * 1e5, 0 }, { coupling * 1e5, 3e5, 0 }, { 0, 0, 1e5 } },
        0.1,
        [0, 0, 0]);
}
