using System.Numerics;
using Boltup.Engine.Coupling;
using Boltup.Engine.Mounts;
using Boltup.Engine.Parts;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;
using Boltup.Tests.Support;

namespace Boltup.Tests.Engine.Coupling;

public class TwoPortTests
{
    private const int Pieces = 60;

    /// <summary>Error of the lumped rod: a wave angle of at most 3 over 60 pieces is off by (3/60)²/24 = 1e-4, and coupling may magnify it.</summary>
    private const double LumpingError = 2e-3;

    private static readonly FrequencyAxis Axis = FrequencyAxis.Even(20, 20, 50);
    private static readonly Rod Rod = new(4e5, 0.1, 0.06);
    private static readonly JointEnd Driven = Chain.End("source", 1);
    private static readonly JointEnd SourceFoot = Chain.End("source", 2);
    private static readonly JointEnd ReceiverTop = Chain.End("receiver", 1);
    private static readonly JointEnd ReceiverEnd = Chain.End("receiver", 2);

    [Fact]
    public void Predict_MountOfARodInClosedForm_IsTheFinelyLumpedRod()
    {
        PredictionResult mounted = Predict(Chain.Through(Rod.Mount(Axis), SourceFoot, ReceiverTop));
        PredictionResult lumped = PredictLumped();
        for (int response = 0; response < 4; response++)
        {
            Near.Equal(lumped.Spectrum(response), mounted.Spectrum(response), LumpingError);
        }

        Near.Equal(lumped.JointForce(0), mounted.JointForce(0), LumpingError);
        Near.Equal(lumped.JointForce(1), mounted.JointForce(1), LumpingError);
    }

    [Fact]
    public void Predict_TwoPort_NamesTheForcesOfBothEnds()
    {
        PredictionResult mounted = Predict(Chain.Through(Rod.Mount(Axis), SourceFoot, ReceiverTop));
        Assert.Equal(["joint, first end", "joint"], mounted.Operations[0].JointForces.Select(force => force.Joint));
    }

    [Fact]
    public void Predict_FirstAndSecondSwapped_GivesTheSameResponses()
    {
        PredictionResult one = Predict(Chain.Through(Rod.Mount(Axis), SourceFoot, ReceiverTop));
        PredictionResult other = Predict(Chain.Through(Rod.Mount(Axis), ReceiverTop, SourceFoot));
        Near.Equal(one.Spectrum(3), other.Spectrum(3), 1e-12);
        Near.Equal(one.JointForce(0), [.. other.JointForce(1).Select(Complex.Negate)], 1e-12);
    }

    /// <summary>A rod of two halves, the second one twice as long: a series of two-ports is the whole rod in closed form.</summary>
    [Fact]
    public void Series_ThirdAndTwoThirdsOfARod_IsTheRod()
    {
        var whole = new Rod(4e5, 0.1, 0.06);
        MountLaw series = new SeriesMount(
            [new Rod(3 * 4e5, 0.1 / 3, 0.06).Mount(Axis), new Rod(1.5 * 4e5, 0.2 / 3, 0.06).Mount(Axis)]);
        Complex[,] expected = MountAt.Matrix(whole.Mount(Axis), 700);
        Complex[,] found = MountAt.Matrix(series, 700);
        for (int i = 0; i < 4; i++)
        {
            Near.Equal(expected[i / 2, i % 2], found[i / 2, i % 2], 1e-12);
        }
    }

    [Fact]
    public void Parallel_RodAndSpring_IsTheSumOfTheirTerms()
    {
        Complex[,] sum = MountAt.Matrix(new ParallelMount([Rod.Mount(Axis), Chain.Mount(5e4, 0)]), 300);
        (Complex driving, Complex transfer) = Rod.Terms(300);
        Near.Equal(driving + 5e4, sum[0, 0], 1e-14);
        Near.Equal(-transfer + 5e4, sum[0, 1], 1e-14);
        Near.Equal(-transfer + 5e4, sum[1, 0], 1e-14);
        Near.Equal(driving + 5e4, sum[1, 1], 1e-14);
    }

    /// <summary>
    /// Blocked condition of ISO 10846-1 (check values of public transcripts): on a termination of stiffness k_t the force is
    /// F₂ = F₂,blocked / (1 + k₂₂/k_t), F₂,blocked = −k₂₁u₁.
    /// </summary>
    [Fact]
    public void Predict_OnATermination_ReducesTheBlockedForceByTheRatioOfStiffness()
    {
        const double termination = 3e6;
        const double mass = 0.01;
        PlacedPart support = Chain.Part("support", [mass], new LumpedLink(0, null, termination, 0, 0));
        PredictionResult result = Chain.Predict(
            Axis,
            [Chain.Part("source", [2, 1], [1e6], 0.02), support],
            [Chain.Through(Rod.Mount(Axis), SourceFoot, Chain.End("support", 1))],
            [Chain.Force(ForceKind.Applied, Axis, Driven, 1)],
            Chain.At(SourceFoot));
        for (int line = 0; line < Axis.Count; line++)
        {
            (Complex k22, Complex k21) = Rod.Terms(Axis[line]);
            double kt = termination - Axis.Omega(line) * Axis.Omega(line) * mass;
            Near.Equal(-k21 * result.Spectrum()[line] / (1 + k22 / kt), result.JointForce(1)[line], 1e-11);
        }
    }

    [Fact]
    public void Predict_BetweenPartAndGround_ReportsTheForceOnTheGround()
    {
        PredictionResult result = Chain.Predict(
            Axis,
            [Chain.Part("source", [2, 1], [1e6], 0.02)],
            [Chain.Through(Rod.Mount(Axis), SourceFoot, JointEnd.Ground)],
            [Chain.Force(ForceKind.Applied, Axis, Driven, 1)],
            Chain.At(SourceFoot));
        for (int line = 0; line < Axis.Count; line++)
        {
            (Complex k11, Complex k21) = Rod.Terms(Axis[line]);
            Near.Equal(k11 * result.Spectrum()[line], result.JointForce(0)[line], 1e-11);
            Near.Equal(-k21 * result.Spectrum()[line], result.JointForce(1)[line], 1e-11);
        }
    }

    private static PredictionResult Predict(Joint joint) => Chain.Predict(
        Axis, [Source, Receiver], [joint], [Chain.Force(ForceKind.Applied, Axis, Driven, 1)], Responses);

    private static PredictionResult PredictLumped() => Chain.Predict(
        Axis,
        [Source, Rod.Lumped("rod", Pieces), Receiver],
        [
            Joint.Rigid("top", SourceFoot, Chain.End("rod", 1), Direction.X),
            Joint.Rigid("bottom", Chain.End("rod", Pieces + 1), ReceiverTop, Direction.X),
        ],
        [Chain.Force(ForceKind.Applied, Axis, Driven, 1)],
        Responses);

    private static PlacedPart Source => Chain.Part("source", [2, 1], [1e6], 0.02);

    private static PlacedPart Receiver => Chain.Part("receiver", [3, 4], [5e5], 0.02, (2, 2e5));

    private static Response[] Responses => [Chain.At(Driven), Chain.At(SourceFoot), Chain.At(ReceiverTop), Chain.At(ReceiverEnd)];
}
