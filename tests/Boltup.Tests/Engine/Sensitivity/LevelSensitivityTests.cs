using Boltup.Engine.Coupling;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Mounts;
using Boltup.Engine.Parts;
using Boltup.Engine.Prediction;
using Boltup.Engine.Sensitivity;
using Boltup.Engine.Spectra;
using Boltup.Tests.Support;

namespace Boltup.Tests.Engine.Sensitivity;

/// <summary>Sensitivities by adjoint solution against central differences of whole predictions.</summary>
public class LevelSensitivityTests
{
    /// <summary>
    /// Step of ln p. A central difference is off by the square of the step, times a third derivative of order one, and by rounding of the
    /// level over the step: 1e-8 and 1e-11 of a derivative of order one.
    /// </summary>
    private const double Step = 1e-4;

    /// <summary>Six digits of the largest derivative of the response.</summary>
    private const double SixDigits = 1e-6;

    private const double Percent = 0.01;

    private static readonly double Decibel = Math.Log(10) / 20;
    private static readonly FrequencyAxis Axis = Triaxial.Axis;
    private static readonly Rod Foot = new(4e5, 0.1, 0.06);

    [Fact]
    public void MountStiffness_OfEveryDirection_IsTheCentralDifference()
    {
        foreach (Direction direction in Triaxial.Directions)
        {
            AssertDerivatives(SensitivityKind.MountStiffness, "m", direction, step => Triaxial.Of(mount: new GrownMount(Triaxial.Springs(), direction, step, lossOnly: false)), Percent);
        }
    }

    [Fact]
    public void MountLoss_OfEveryDirection_IsTheCentralDifference()
    {
        foreach (Direction direction in Triaxial.Directions)
        {
            AssertDerivatives(SensitivityKind.MountLoss, "m", direction, step => Triaxial.Of(mount: new GrownMount(Triaxial.Springs(), direction, step, lossOnly: true)), Percent);
        }
    }

    [Fact]
    public void MountStiffness_OfACoupledMount_ScalesRowAndColumn() => AssertDerivatives(
        SensitivityKind.MountStiffness, "m", Direction.Y, step => Triaxial.Of(mount: new GrownMount(Triaxial.Matrix(), Direction.Y, step, lossOnly: false)), Percent, () => Triaxial.Of(Triaxial.Matrix()));

    [Fact]
    public void MountStiffness_OfAMountWithMassEffect_IsTheCentralDifference()
    {
        foreach (SensitivityKind kind in new[] { SensitivityKind.MountStiffness, SensitivityKind.MountLoss })
        {
            AssertDerivatives(kind, "m", Direction.X, step => OneAxis(new GrownMount(Foot.Mount(Axis), Direction.X, step, lossOnly: kind == SensitivityKind.MountLoss)), Percent, () => OneAxis(Foot.Mount(Axis)));
        }
    }

    [Fact]
    public void Force_PerDecibel_IsTheCentralDifference() =>
        AssertDerivatives(SensitivityKind.Force, "source.1.y", null, step => Triaxial.Of(force: 1 + step), Decibel);

    [Theory]
    [InlineData("source", "2", "z")]
    [InlineData("receiver", "1", "x")]
    [InlineData("receiver", "2", "y")]
    public void FrfRow_PerDecibel_IsTheCentralDifference(string part, string point, string direction) => AssertDerivatives(
        SensitivityKind.FrfRow, $"{part}.{point}.{direction}", null, step => Triaxial.Of(row: (part, point, direction, 1 + step)), Decibel);

    [Fact]
    public void EveryLevel_WithEnergySums_IsTheCentralDifference() => AssertDerivatives(
        SensitivityKind.MountStiffness, "m", Direction.X, step => Triaxial.Of(mount: new GrownMount(Triaxial.Springs(), Direction.X, step, lossOnly: false), sum: ForceSum.Energy),
        Percent, () => Triaxial.Of(sum: ForceSum.Energy));

    [Fact]
    public void AllForces_Together_GiveOneDecibelPerDecibel()
    {
        foreach (ResponseSensitivities response in Predict(Triaxial.Of()).Sensitivities)
        {
            double sum = response.Levels.Where(level => level.Parameter.Kind == SensitivityKind.Force).Sum(level => level.Decibels);
            Assert.Equal(1, sum, 1e-10);
        }
    }

    /// <summary>Compares the derivatives of all responses with central differences.</summary>
    /// <param name="changed">The assembly with ln p greater by a step.</param>
    /// <param name="unit">Step of ln p that the derivative is for.</param>
    private static void AssertDerivatives(
        SensitivityKind kind, string name, Direction? direction, Func<double, AssemblyModel> changed, double unit, Func<AssemblyModel>? unchanged = null)
    {
        OperationResult result = Predict((unchanged ?? (() => Triaxial.Of()))());
        OperationResult above = Predict(changed(Step)), below = Predict(changed(-Step));
        for (int i = 0; i < result.Responses.Count; i++)
        {
            LevelSensitivity found = result.Sensitivities[i].Levels.Single(
                level => level.Parameter == new SensitivityParameter(kind, name, direction));
            double expected = unit * (Level(above, i) - Level(below, i)) / (2 * Step);
            double scale = result.Sensitivities[i].Levels.Where(level => level.Parameter.Kind == kind).Max(level => Math.Abs(level.Decibels));
            Assert.True(
                Math.Abs(expected - found.Decibels) <= SixDigits * scale,
                FormattableString.Invariant($"{name} {direction}, response {i}: expected {expected}, found {found.Decibels}"));
            Assert.True(Math.Abs(found.Decibels) > 100 * SixDigits * scale, "too small to be checked");
        }
    }

    private static double Level(OperationResult result, int response) =>
        10 * Math.Log10(result.Responses[response].Values.Sum(value => value.Real * value.Real + value.Imaginary * value.Imaginary));

    private static OperationResult Predict(AssemblyModel assembly)
    {
        var diagnostics = new DiagnosticBag();
        PredictionResult? result = Predictor.Predict(assembly, diagnostics, withPaths: true);
        Assert.True(result is not null, string.Join("\n", diagnostics.Items.Select(item => item.Message)));
        return result.Operations[0];
    }

    private static AssemblyModel OneAxis(MountLaw mount)
    {
        PlacedPart[] parts = [Chain.Part("source", [1, 2], [1e5], 0.02), Chain.Part("receiver", [3, 4], [5e4], 0.02, (2, 2e5))];
        Joint joint = Joint.Through(mount, "j", Chain.End("source", 2), Chain.End("receiver", 1)) with { MountName = "m" };
        var operation = new Operation("run", ForceSum.Phase, Amplitude.Rms, [Chain.Force(ForceKind.Applied, Axis, Chain.End("source", 1), 1)]);
        return new AssemblyModel("one axis", Axis, parts, [joint], [operation], [Chain.At(Chain.End("receiver", 2))]);
    }
}
