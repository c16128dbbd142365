using System.Numerics;
using Boltup.Engine.Coupling;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Parts;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;
using Boltup.Tests.Support;

namespace Boltup.Tests.Engine.Prediction;

public class ForceSumTests
{
    private static readonly FrequencyAxis Axis = FrequencyAxis.Even(10, 10, 12);
    private static readonly PlacedPart Left = Chain.Part("left", [1, 2], [1e5], 0.02);
    private static readonly PlacedPart Right = Chain.Part("right", [1.5, 0.7], [6e4], 0.04);
    private static readonly PlacedPart Base = Chain.Part("base", [3, 4], [5e4], 0.02, (2, 2e5));
    private static readonly ForceSet First = Chain.Force(ForceKind.Applied, Axis, Chain.End("left", 1), new Complex(1, 0.5));
    private static readonly ForceSet Second = Chain.Force(ForceKind.Applied, Axis, Chain.End("right", 1), new Complex(-0.3, 0.8));

    [Fact]
    public void Predict_SumInPhase_AddsComplexResponses()
    {
        Complex[] sum = Predict(ForceSum.Phase, First, Second);
        Complex[] first = Predict(ForceSum.Phase, First);
        Complex[] second = Predict(ForceSum.Phase, Second);
        Near.Equal([.. first.Zip(second, (a, b) => a + b)], sum, 1e-13);
    }

    [Fact]
    public void Predict_SumOfEnergies_AddsPowersAndHasNoPhase()
    {
        Complex[] sum = Predict(ForceSum.Energy, First, Second);
        Complex[] first = Predict(ForceSum.Phase, First);
        Complex[] second = Predict(ForceSum.Phase, Second);
        for (int line = 0; line < Axis.Count; line++)
        {
            Assert.Equal(0, sum[line].Imaginary);
            double power = Math.Pow(Complex.Abs(first[line]), 2) + Math.Pow(Complex.Abs(second[line]), 2);
            Assert.Equal(Math.Sqrt(power), sum[line].Real, 1e-13 * Math.Sqrt(power));
        }
    }

    private static Complex[] Predict(ForceSum sum, params ForceSet[] forces)
    {
        Joint[] joints =
        [
            Joint.Through(Chain.Mount(8e4, 0.1), "left mount", Chain.End("left", 2), Chain.End("base", 1)),
            Joint.Through(Chain.Mount(3e4, 0.2), "right mount", Chain.End("right", 2), Chain.End("base", 1)),
        ];
        var operation = new Operation("run", sum, Amplitude.Rms, forces);
        Response response = Chain.At(Chain.End("base", 2)) with { As = Quantity.Acceleration };
        var assembly = new AssemblyModel("two sources", Axis, [Left, Right, Base], joints, [operation], [response]);
        return Predictor.Predict(assembly, new DiagnosticBag())!.Spectrum();
    }
}
