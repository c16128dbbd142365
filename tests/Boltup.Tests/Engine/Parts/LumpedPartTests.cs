using System.Numerics;
using Boltup.Engine;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Parts;
using Boltup.Engine.Spectra;
using Boltup.Tests.Support;

namespace Boltup.Tests.Engine.Parts;

public class LumpedPartTests
{
    private static readonly Dof One = Dof.Parse("1.x");
    private static readonly Dof Two = Dof.Parse("2.x");

    /// <summary>Single-degree-of-freedom oscillator, any vibration textbook: m = 2 kg, k = 8e4 N/m, c = 8 N·s/m.</summary>
    [Theory]
    [InlineData(10, 1.386812e-5, -9.667768e-8)]
    [InlineData(50, -8.514559e-6, -1.822901e-7)]
    [InlineData(100, -1.409237e-6, -9.982966e-9)]
    public void Evaluate_Oscillator_GivesTextbookReceptance(double hz, double real, double imaginary)
    {
        Complex receptance = Oscillator(hz);
        Assert.Equal(real, receptance.Real, Math.Abs(real) * 1e-6);
        Assert.Equal(imaginary, receptance.Imaginary, Math.Abs(imaginary) * 1e-6);
    }

    /// <summary>At resonance the same oscillator has receptance −j/(ωc), mobility 1/c and accelerance jω/c.</summary>
    [Fact]
    public void Evaluate_OscillatorAtResonance_IsLimitedByDampingOnly()
    {
        double omega = Math.Sqrt(8e4 / 2);
        Complex receptance = Oscillator(omega / (2 * Math.PI));
        Near.Equal(new Complex(0, -6.25e-4), receptance, 1e-10);
        Near.Equal(0.125, Complex.ImaginaryOne * omega * receptance, 1e-10);
        Near.Equal(new Complex(0, 25), -omega * omega * receptance, 1e-10);
    }

    /// <summary>Thomson, Theory of Vibration with Applications: wall-k-m-k-m has ω = 0.618034 and 1.618034 for k = m = 1.</summary>
    [Theory]
    [InlineData(0.618034)]
    [InlineData(1.618034)]
    public void Evaluate_TwoMassesOnAWall_ResonatesAtTheGoldenRatio(double omega)
    {
        PlacedPart part = Chain.Part("p", [1, 1], new LumpedLink(0, null, 1, 1e-9, 0), new LumpedLink(0, 1, 1, 1e-9, 0));
        AssertPeak(part.Model, omega);
    }

    /// <summary>Thomson: wall-k-m-k-m-k-wall has ω = 1 with shape (1, 1) and ω = √3 with shape (1, −1).</summary>
    [Theory]
    [InlineData(1.0, 1.0)]
    [InlineData(1.7320508075688772, -1.0)]
    public void Evaluate_TwoMassesBetweenWalls_ResonatesInTheTextbookShapes(double omega, double ratio)
    {
        PlacedPart part = Chain.Part(
            "p", [1, 1], new LumpedLink(0, null, 1, 1e-6, 0), new LumpedLink(0, 1, 1, 1e-6, 0), new LumpedLink(1, null, 1, 1e-6, 0));
        FrfMatrix frf = Evaluate(part.Model, omega / (2 * Math.PI), [One, Two], [One]);
        Near.Equal(ratio, frf[0, 1, 0] / frf[0, 0, 0], 1e-5);
        AssertPeak(part.Model, omega);
    }

    /// <summary>ISO 7626: a rigid mass of 10 kg at 100 Hz has |accelerance| 0.1 1/kg and |mobility| 1.59155e-4 m/(N·s).</summary>
    [Fact]
    public void Evaluate_RigidMass_HasTheCalibrationAccelerance()
    {
        PlacedPart part = Chain.Part("p", [10]);
        Complex receptance = Evaluate(part.Model, 100, [One], [One])[0, 0, 0];
        double omega = 2 * Math.PI * 100;
        Assert.Equal(0.100, Complex.Abs(receptance) * omega * omega, 12);
        Assert.Equal(1.59155e-4, Complex.Abs(receptance) * omega, 1e-9);
    }

    [Fact]
    public void Evaluate_UndampedResonanceOnALine_NamesPartAndFrequency()
    {
        var diagnostics = new DiagnosticBag();
        PlacedPart part = Chain.Part("p", [1], new LumpedLink(0, null, 0, 0, 0));
        FrfMatrix? frf = part.Model.Evaluate(FrequencyAxis.FromHertz([0, 1]), [One], [One], diagnostics);
        Assert.Null(frf);
        Diagnostic error = Assert.Single(diagnostics.Items);
        Assert.Equal(EngineCodes.NoUniqueResponse, error.Code);
        Assert.Equal("part `p` has no unique response at 0 Hz", error.Message);
    }

    private static Complex Oscillator(double hz) =>
        Evaluate(Chain.Part("p", [2], new LumpedLink(0, null, 8e4, 0, 8)).Model, hz, [One], [One])[0, 0, 0];

    private static FrfMatrix Evaluate(IPartModel model, double hz, Dof[] rows, Dof[] columns) =>
        model.Evaluate(FrequencyAxis.FromHertz([hz]), rows, columns, new DiagnosticBag())!;

    /// <summary>The receptance on the frequency exceeds those 0.1 % beside it a hundredfold.</summary>
    private static void AssertPeak(IPartModel model, double omega)
    {
        double At(double w) => Complex.Abs(Evaluate(model, w / (2 * Math.PI), [One], [One])[0, 0, 0]);
        Assert.True(At(omega) > 100 * At(omega * 1.001));
        Assert.True(At(omega) > 100 * At(omega * 0.999));
    }
}
