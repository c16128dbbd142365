using Boltup.Engine.Evidence;
using Boltup.Engine.Mounts;
using Boltup.Engine.Spectra;

namespace Boltup.Tests.Support;

/// <summary>The constant mounts of the reference case, from the compressor's interface to the bench.</summary>
internal static class BenchMounts
{
    private const double LossFactor = 1.226652450190e-01;

    private static readonly double[][] Stiffness =
    [
        [2.197708472416e+05, 1.449898446528e+05, 3.546165634815e+05],
        [2.184002230408e+05, 1.464801337713e+05, 3.429025535924e+05],
        [2.208274696911e+05, 1.535590570858e+05, 3.429812139192e+05],
        [2.060051396489e+05, 1.483137513879e+05, 3.387789069067e+05],
    ];

    public static readonly MountPath[] All = [.. Stiffness.Select((k, i) => new MountPath(Mount(k), $"10{i + 1}", $"30{i + 1}"))];

    private static DiagonalMount Mount(double[] stiffness) =>
        new(stiffness.Select((k, direction) => new SpringDamper((Direction)direction, k, LossFactor, 0)));
}
