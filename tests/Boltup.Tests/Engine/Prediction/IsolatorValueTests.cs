using System.Numerics;
using Boltup.Engine.Coupling;
using Boltup.Engine.Parts;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;
using Boltup.Tests.Support;

namespace Boltup.Tests.Engine.Prediction;

/// <summary>Published transmissibility and isolator values, reproduced by assemblies of one mount.</summary>
public class IsolatorValueTests
{
    private const double MassKg = 2;
    private const double Stiffness = 8e4;

    private static readonly double NaturalHz = Math.Sqrt(Stiffness / MassKg) / (2 * Math.PI);
    private static readonly double[] Ratios = [0.5, 1, Math.Sqrt(2), 2, 3, 5, 10];

    private static readonly Dictionary<double, double[]> Transmissibility = new()
    {
        [0.05] = [1.332, 10.0499, 1, 0.3392, 0.1304, 0.0466, 0.0143],
        [0.2] = [1.3138, 2.6926, 1, 0.4125, 0.1931, 0.0928, 0.0416],
    };

    /// <summary>
    /// √[(1+(2ζr)²)/((1−r²)²+(2ζr)²)] of a damped mass (any vibration textbook; recomputed). The base is a part that a force shakes: the
    /// ratio of the two motions depends on the mount and the mass alone, however heavy the base is.
    /// </summary>
    [Theory]
    [InlineData(0.05, 0.3)]
    [InlineData(0.05, 300)]
    [InlineData(0.2, 5)]
    public void Predict_MassOnAMovingBase_FollowsTheTransmissibilityTable(double dampingRatio, double baseKg)
    {
        PredictionResult result = Chain.Predict(
            Axis,
            [Chain.Part("base", [baseKg], [], 0), Mass],
            [Chain.Through(Damped(dampingRatio), Chain.End("base", 1), Chain.End("mass", 1))],
            [Chain.Force(ForceKind.Applied, Axis, Chain.End("base", 1), 1)],
            Chain.At(Chain.End("base", 1)),
            Chain.At(Chain.End("mass", 1)));
        AssertTable(dampingRatio, result.Spectrum(1).Zip(result.Spectrum(0), (mass, moved) => Complex.Abs(mass / moved)));
    }

    /// <summary>The same table as the share of a force on the mass that reaches the ground.</summary>
    [Theory]
    [InlineData(0.05)]
    [InlineData(0.2)]
    public void Predict_ForceOnAMountedMass_FollowsTheTransmissibilityTable(double dampingRatio)
    {
        PredictionResult result = Chain.Predict(
            Axis,
            [Mass],
            [Chain.Through(Damped(dampingRatio), Chain.End("mass", 1), JointEnd.Ground)],
            [Chain.Force(ForceKind.Applied, Axis, Chain.End("mass", 1), 1)]);
        AssertTable(dampingRatio, result.JointForce().Select(Complex.Abs));
    }

    /// <summary>|k| = 1e6(1 + 0.05j) N/m has 120.01 dB re 1 N/m (ISO 10846-1, as transcribed by public sources).</summary>
    [Fact]
    public void Predict_BlockedMount_HasTheStiffnessLevelOfIso10846()
    {
        FrequencyAxis axis = FrequencyAxis.FromHertz([500]);
        PredictionResult result = Chain.Predict(
            axis,
            [Chain.Part("mass", [1.0], [], 0)],
            [Chain.Through(Chain.Mount(1e6, 0.05), Chain.End("mass", 1), JointEnd.Ground)],
            [Chain.Force(ForceKind.Applied, axis, Chain.End("mass", 1), 1)],
            Chain.At(Chain.End("mass", 1)));
        double level = 20 * Math.Log10(Complex.Abs(result.JointForce()[0] / result.Spectrum()[0]));
        Assert.Equal(120.01, level, 5e-3);
    }

    /// <summary>
    /// Indirect method of ISO 10846-3 (as transcribed by public sources): T = 0.01 on a blocking mass of 10 kg at 500 Hz means
    /// k₂₁ ≈ ω²m₂T = 9.870e5 N/m; the mount that gives exactly this T is 1 % softer, as T is not quite small.
    /// </summary>
    [Fact]
    public void Predict_MountOnABlockingMass_GivesTheStiffnessOfTheIndirectMethod()
    {
        FrequencyAxis axis = FrequencyAxis.FromHertz([500]);
        double inertia = axis.Omega(0) * axis.Omega(0) * 10;
        PredictionResult result = Chain.Predict(
            axis,
            [Chain.Part("shaken", [1.0], [], 0), Chain.Part("blocking", [10.0], [], 0)],
            [Chain.Through(Chain.Mount(0.01 * inertia / 1.01, 0), Chain.End("shaken", 1), Chain.End("blocking", 1))],
            [Chain.Force(ForceKind.Applied, axis, Chain.End("shaken", 1), 1)],
            Chain.At(Chain.End("shaken", 1)),
            Chain.At(Chain.End("blocking", 1)));
        double transmissibility = Complex.Abs(result.Spectrum(1)[0] / result.Spectrum(0)[0]);
        Assert.Equal(0.01, transmissibility, 1e-12);
        Assert.Equal(9.870e5, inertia * transmissibility, 50.0);
    }

    private static FrequencyAxis Axis => FrequencyAxis.FromHertz([.. Ratios.Select(ratio => ratio * NaturalHz)]);

    private static PlacedPart Mass => Chain.Part("mass", [MassKg], [], 0);

    private static Boltup.Engine.Mounts.MountLaw Damped(double dampingRatio) =>
        Chain.Mount(Stiffness, 0, 2 * dampingRatio * Math.Sqrt(Stiffness * MassKg));

    /// <summary>The table gives four decimals.</summary>
    private static void AssertTable(double dampingRatio, IEnumerable<double> found) => Assert.All(
        found.Zip(Transmissibility[dampingRatio]), pair => Assert.Equal(pair.Second, pair.First, 6e-5));
}
