using System.Numerics;
using Boltup.Engine.Coupling;
using Boltup.Engine.Parts;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;
using Boltup.Tests.Support;

namespace Boltup.Tests.Engine.Coupling;

/// <summary>What must hold for any joint: its limits, and that order is only a matter of notation.</summary>
public class CouplingLimitTests
{
    private static readonly FrequencyAxis Axis = FrequencyAxis.Even(5, 7.5, 40);
    private static readonly PlacedPart A = Chain.Part("A", [1, 2], [1e5], 0.02);
    private static readonly PlacedPart B = Chain.Part("B", [3, 4], [5e4], 0.02, (2, 2e5));
    private static readonly PlacedPart C = Chain.Part("C", [0.5, 0.8], [3e4], 0.05);
    private static readonly JointEnd A1 = Chain.End("A", 1);
    private static readonly JointEnd A2 = Chain.End("A", 2);
    private static readonly JointEnd B1 = Chain.End("B", 1);
    private static readonly JointEnd B2 = Chain.End("B", 2);
    private static readonly JointEnd C1 = Chain.End("C", 1);
    private static readonly JointEnd C2 = Chain.End("C", 2);

    [Fact]
    public void Predict_VeryStiffMount_ApproachesTheRigidJoint()
    {
        Complex[] rigid = Respond(Chain.Rigid(A2, B1));
        Assert.True(Near.RelativeError(rigid, Respond(Mounted(1e9))) < 1e-3);
        Assert.True(Near.RelativeError(rigid, Respond(Mounted(1e14))) < 1e-8);
    }

    [Fact]
    public void Predict_VerySoftMount_LeavesThePartsUncoupled()
    {
        PredictionResult alone = Chain.Predict(Axis, [A], [], [Unit(A1)], Chain.At(A2));
        PredictionResult soft = Chain.Predict(Axis, [A, B], [Mounted(1e-6)], [Unit(A1)], Chain.At(A2), Chain.At(B2));
        Near.Equal(alone.Spectrum(), soft.Spectrum(), 1e-9);
        Assert.True(soft.Spectrum(1).Max(Complex.Abs) < 1e-9 * alone.Spectrum().Max(Complex.Abs));
    }

    [Fact]
    public void Predict_MountBetweenMasses_EqualsALinkOfOnePart()
    {
        PlacedPart whole = Chain.Part(
            "W",
            [1, 2, 3, 4],
            new LumpedLink(0, 1, 1e5, 0.02, 0),
            new LumpedLink(1, 2, 7e4, 0.1, 35),
            new LumpedLink(2, 3, 5e4, 0.02, 0),
            new LumpedLink(3, null, 2e5, 0.02, 0));
        Complex[] direct = Chain.Predict(Axis, [whole], [], [Unit(Chain.End("W", 1))], Chain.At(Chain.End("W", 4))).Spectrum();
        Joint joint = Chain.Through(Chain.Mount(7e4, 0.1, 35), A2, B1);
        Near.Equal(direct, Respond(joint), 1e-11);
    }

    [Fact]
    public void Predict_PartsAndJointsInAnotherOrder_ChangesNothingButRounding()
    {
        Joint first = Mounted(8e4);
        Joint second = Joint.Through(Chain.Mount(2e4, 0.2), "second", B2, C1);
        PredictionResult one = Chain.Predict(Axis, [A, B, C], [first, second], [Unit(A1)], Chain.At(C2), Chain.At(B1));
        Joint turned = Joint.Through(Chain.Mount(2e4, 0.2), "second", C1, B2);
        PredictionResult other = Chain.Predict(Axis, [C, B, A], [turned, first], [Unit(A1)], Chain.At(B1), Chain.At(C2));
        Near.Equal(one.Spectrum(0), other.Spectrum(1), 1e-12);
        Near.Equal(one.Spectrum(1), other.Spectrum(0), 1e-12);
        Near.Equal(one.JointForce(1), other.JointForce(0).Select(force => -force).ToArray(), 1e-12);
    }

    [Fact]
    public void Predict_ForceAndResponseSwapped_GivesTheSameFrf() =>
        Near.Equal(
            Chain.Predict(Axis, [A, B], [Mounted(8e4)], [Unit(A1)], Chain.At(B2)).Spectrum(),
            Chain.Predict(Axis, [A, B], [Mounted(8e4)], [Unit(B2)], Chain.At(A1)).Spectrum(),
            1e-11);

    /// <summary>A negative copy of B, rigidly joined to A+B at all of its dofs, takes B out again.</summary>
    [Fact]
    public void Predict_CoupledThenSplit_GivesThePartBack()
    {
        PlacedPart minusB = Chain.Part(
            "minus B", [-3, -4], new LumpedLink(0, 1, -5e4, 0.02, 0), new LumpedLink(1, null, -2e5, 0.02, 0));
        Joint[] joints =
        [
            Chain.Rigid(A2, B1),
            Chain.Rigid(B1, Chain.End("minus B", 1)),
        ];
        Complex[] alone = Chain.Predict(Axis, [A], [], [Unit(A1)], Chain.At(A2)).Spectrum();
        Complex[] split = Chain.Predict(Axis, [A, B, minusB], joints, [Unit(A1)], Chain.At(A2)).Spectrum();
        Near.Equal(alone, split, 1e-9);
    }

    [Fact]
    public void Predict_JointToGround_HoldsThePoint()
    {
        PredictionResult held = Chain.Predict(Axis, [A], [Chain.Rigid(JointEnd.Ground, A2)], [Unit(A1)], Chain.At(A2), Chain.At(A1));
        Assert.True(held.Spectrum(0).Max(Complex.Abs) < 1e-12 * held.Spectrum(1).Max(Complex.Abs));
    }

    /// <summary>Force transmissibility of a mass on a spring and damper, √[(1+(2ζr)²)/((1−r²)²+(2ζr)²)], recomputed from the formula.</summary>
    [Theory]
    [InlineData(0.05, new[] { 1.332, 10.0499, 1, 0.3392, 0.1304, 0.0466, 0.0143 })]
    [InlineData(0.2, new[] { 1.3138, 2.6926, 1, 0.4125, 0.1931, 0.0928, 0.0416 })]
    public void Predict_MassOnAMountToGround_TransmitsAsTheTextbookSays(double dampingRatio, double[] transmissibility)
    {
        double[] ratios = [0.5, 1, Math.Sqrt(2), 2, 3, 5, 10];
        double omega = 2 * Math.PI * 10;
        FrequencyAxis axis = FrequencyAxis.FromHertz([.. ratios.Select(ratio => 10 * ratio)]);
        Joint mount = Chain.Through(
            Chain.Mount(3 * omega * omega, 0, 2 * dampingRatio * 3 * omega), Chain.End("mass", 1), JointEnd.Ground);
        PredictionResult result = Chain.Predict(
            axis,
            [Chain.Part("mass", [3])],
            [mount],
            [Chain.Force(ForceKind.Applied, axis, Chain.End("mass", 1), 1)],
            Chain.At(Chain.End("mass", 1)));
        for (int i = 0; i < ratios.Length; i++)
        {
            Assert.Equal(transmissibility[i], Complex.Abs(result.JointForce()[i]), 6e-5 * Math.Max(1, transmissibility[i]));
        }
    }

    private static Joint Mounted(double stiffness) => Chain.Through(Chain.Mount(stiffness, 0.1), A2, B1);

    private static ForceSet Unit(JointEnd at) => Chain.Force(ForceKind.Applied, Axis, at, 1);

    private static Complex[] Respond(Joint joint) => Chain.Predict(Axis, [A, B], [joint], [Unit(A1)], Chain.At(B2)).Spectrum();
}
