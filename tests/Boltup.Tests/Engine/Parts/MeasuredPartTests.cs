using System.Numerics;
using Boltup.Engine;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Parts;
using Boltup.Engine.Spectra;
using Boltup.Tests.Support;

namespace Boltup.Tests.Engine.Parts;

public class MeasuredPartTests
{
    private static readonly FrequencyAxis Axis = FrequencyAxis.Even(10, 5, 21);
    private static readonly Complex Value = new(2e-6, -3e-7);

    [Theory]
    [InlineData(Quantity.Displacement)]
    [InlineData(Quantity.Velocity)]
    [InlineData(Quantity.Acceleration)]
    public void Evaluate_AnyMotionQuantity_BecomesReceptance(Quantity motion)
    {
        int order = FrfQuantity.DerivativeOrder(motion);
        FrfMatrix? frf = Evaluate(
            Axis, "a.x", "b.y", new InMemoryCurve("a.x", "b.y", new(motion, Quantity.Force), Axis, hz => Value * Complex.Pow(JOmega(hz), order)));
        Assert.All(Enumerable.Range(0, Axis.Count), line => Near.Equal(Value, frf![line, 0, 0], 1e-14));
    }

    [Fact]
    public void Evaluate_PressureOverForce_StaysAsItIs()
    {
        FrfMatrix? frf = Evaluate(
            Axis, "ear.p", "b.y", new InMemoryCurve("ear.p", "b.y", FrfQuantity.PressurePerForce, Axis, hz => new Complex(hz, 1)));
        Assert.Equal(new Complex(30, 1), frf![4, 0, 0]);
    }

    [Fact]
    public void Evaluate_MissingMotionFrf_IsFilledFromTheTransposed()
    {
        var diagnostics = new DiagnosticBag();
        FrfMatrix? frf = Evaluate(
            Axis, "a.x", "b.y", diagnostics, new InMemoryCurve("b.y", "a.x", FrfQuantity.Receptance, Axis, hz => Value * hz));
        Near.Equal(Value * 10, frf![0, 0, 0], 1e-15);
        Diagnostic note = Assert.Single(diagnostics.Items);
        Assert.Equal(EngineCodes.FilledByReciprocity, note.Code);
        Assert.Equal(["a.x / b.y from b.y / a.x"], note.Notes);
    }

    /// <summary>
    /// Vibro-acoustic reciprocity p/F = −v/q, checked on a closed form: a piston (area S) at one end of a small closed cavity of
    /// stiffness K_a = ρc²/V. A volume velocity q into the cavity gives p = K_a q/(jω) and pushes the free piston of mass m outward
    /// with F = S p; a force F outward moves the piston and lowers the pressure.
    /// </summary>
    [Fact]
    public void Evaluate_MissingPressureFrf_IsFilledFromMotionPerVolumeVelocityWithItsSign()
    {
        const double area = 0.01;
        const double mass = 0.2;
        const double cavity = 1.4e5 / 0.03;
        Complex System(double hz) => mass * JOmega(hz) * JOmega(hz) + cavity * area * area;
        Complex PressurePerForce(double hz) => -cavity * area / System(hz);
        Complex VelocityPerVolumeVelocity(double hz) => cavity * area / System(hz);
        FrfMatrix? frf = Evaluate(
            Axis,
            "ear.p",
            "b.y",
            new InMemoryCurve("b.y", "ear.q", new(Quantity.Velocity, Quantity.VolumeVelocity), Axis, VelocityPerVolumeVelocity));
        Near.Equal(PressurePerForce(25), frf![3, 0, 0], 1e-12);
    }

    [Fact]
    public void HasFrf_WithoutReciprocity_KnowsWhatWasMeasuredOnly()
    {
        var part = new MeasuredPart("part", [Constant("a.x", "b.y")], fillByReciprocity: false, Axis);
        Assert.True(part.HasFrf(Dof.Parse("a.x"), Dof.Parse("b.y")));
        Assert.False(part.HasFrf(Dof.Parse("b.y"), Dof.Parse("a.x")));
    }

    [Fact]
    public void Evaluate_LinesBetween_InterpolatesRealAndImaginaryPartsAndWarns()
    {
        var diagnostics = new DiagnosticBag();
        FrequencyAxis between = FrequencyAxis.FromHertz([10, 12, 15]);
        var curve = new InMemoryCurve("a.x", "b.y", FrfQuantity.Receptance, Axis, hz => new Complex(hz, -2 * hz));
        FrfMatrix? frf = Evaluate(between, "a.x", "b.y", diagnostics, curve);
        Near.Equal(new Complex(12, -24), frf![1, 0, 0], 1e-14);
        Diagnostic warning = Assert.Single(diagnostics.Items);
        Assert.Equal("part `part`: FRFs were interpolated at 1 line", warning.Message);
    }

    [Fact]
    public void Evaluate_OutsideTheBand_IsRefused() =>
        AssertError(EngineCodes.OutsideBand, FrequencyAxis.FromHertz([5, 10]), Constant("a.x", "b.y"));

    [Fact]
    public void Evaluate_AcceleranceAtZeroHertz_IsRefused()
    {
        FrequencyAxis fromZero = FrequencyAxis.FromHertz([0, 5]);
        AssertError(
            EngineCodes.ZeroFrequency, fromZero, new InMemoryCurve("a.x", "b.y", FrfQuantity.Accelerance, fromZero, _ => Value));
    }

    [Fact]
    public void Evaluate_NotANumber_NamesTheLine()
    {
        Diagnostic error = AssertError(
            EngineCodes.NotFinite,
            Axis,
            new InMemoryCurve("a.x", "b.y", FrfQuantity.Receptance, Axis, hz => hz == 20 ? double.NaN : 1));
        Assert.Equal("a.x / b.y is no finite number at 20 Hz (line 3)", error.Message);
    }

    private static Complex JOmega(double hz) => new(0, 2 * Math.PI * hz);

    private static InMemoryCurve Constant(string response, string excitation) =>
        new(response, excitation, FrfQuantity.Receptance, Axis, _ => Value);

    private static FrfMatrix? Evaluate(FrequencyAxis axis, string row, string column, IFrfCurve curve) =>
        Evaluate(axis, row, column, new DiagnosticBag(), curve);

    private static FrfMatrix? Evaluate(FrequencyAxis axis, string row, string column, DiagnosticBag diagnostics, IFrfCurve curve) =>
        new MeasuredPart("part", [curve], fillByReciprocity: true, curve.Axis)
            .Evaluate(axis, [Dof.Parse(row)], [Dof.Parse(column)], diagnostics);

    private static Diagnostic AssertError(DiagnosticCode code, FrequencyAxis axis, IFrfCurve curve)
    {
        var diagnostics = new DiagnosticBag();
        Assert.Null(Evaluate(axis, "a.x", "b.y", diagnostics, curve));
        Diagnostic error = Assert.Single(diagnostics.Items);
        Assert.Equal((code, Severity.Error), (error.Code, error.Severity));
        return error;
    }
}
