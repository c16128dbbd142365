using System.Numerics;
using Boltup.Engine.Coupling;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;
using Boltup.Tests.Support;

namespace Boltup.Tests.Engine.Prediction;

public class MountSpectraTests
{
    private static readonly FrequencyAxis Axis = FrequencyAxis.Even(20, 30, 11);

    [Fact]
    public void Predict_MountOfSeveralJoints_IsListedOnceOverAllLines()
    {
        JointEnd first = Chain.End("mass", 1);
        JointEnd second = Chain.End("mass", 2);
        PredictionResult result = Chain.Predict(
            Axis,
            [Chain.Part("mass", [1.0, 2], [1e5], 0.01)],
            [
                Chain.Through(Chain.Mount(1e5, 0, 10), first, JointEnd.Ground) with { MountName = "soft" },
                Chain.Through(Chain.Mount(1e5, 0, 10), second, JointEnd.Ground) with { MountName = "soft" },
            ],
            [Chain.Force(ForceKind.Applied, Axis, first, 1)]);
        MountSpectrum mount = Assert.Single(result.Mounts);
        Assert.Equal("soft", mount.Name);
        Near.Equal([.. Axis.Hz.ToArray().Select(hz => new Complex(1e5, 2 * Math.PI * hz * 10))], Assert.Single(mount.Terms).Values, 1e-15);
    }

    [Fact]
    public void Predict_TwoPort_ListsDrivingAndTransferTerms()
    {
        var rod = new Rod(4e5, 0.1, 0.06);
        PredictionResult result = Chain.Predict(
            Axis,
            [Chain.Part("mass", [1.0], [], 0)],
            [Chain.Through(rod.Mount(Axis), Chain.End("mass", 1), JointEnd.Ground)],
            [Chain.Force(ForceKind.Applied, Axis, Chain.End("mass", 1), 1)]);
        Assert.Equal(["k11", "−k21", "k22"], result.Mounts[0].Terms.Select(term => term.Name));
        Near.Equal(-rod.Terms(Axis[7]).Transfer, result.Mounts[0].Terms[1].Values[7], 1e-14);
    }
}
