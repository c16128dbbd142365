using System.Numerics;
using Boltup.Engine.Coupling;
using Boltup.Engine.MountIdentification;
using Boltup.Engine.Mounts;
using Boltup.Engine.Parts;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;

namespace Boltup.Tests.Support;

/// <summary>A small source on one mount on a small receiver, measured at both ends of the mount.</summary>
internal static class ChainInstallation
{
    public static readonly FrequencyAxis Axis = FrequencyAxis.Even(20, 20, 30);

    public static InstalledMounts Measure(MountLaw mount)
    {
        JointEnd[] ends = [Chain.End("source", 2), Chain.End("receiver", 1)];
        PlacedPart[] parts = [Chain.Part("source", [2, 1], [1e6], 0.02), Chain.Part("receiver", [3, 4], [5e5], 0.02, (2, 2e5))];
        var receptance = new TiledMatrix(Axis.Count, 2, 2);
        for (int column = 0; column < 2; column++)
        {
            PredictionResult result = Chain.Predict(
                Axis, parts, [Chain.Through(mount, ends[0], ends[1])], [Chain.Force(ForceKind.Applied, Axis, ends[column], Complex.One)], Chain.At(ends[0]), Chain.At(ends[1]));
            receptance.ScatterSpectrum(0, column, result.Spectrum(0));
            receptance.ScatterSpectrum(1, column, result.Spectrum(1));
        }

        return new InstalledMounts(Axis, [new Dof("top", Direction.X), new Dof("foot", Direction.X)], receptance, [new MountEnds("top", "foot")]);
    }
}
