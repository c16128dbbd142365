using System.Numerics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.MountIdentification;

/// <summary>Reads one mount, and how far it can be trusted, out of the dynamic stiffness of the installation.</summary>
/// <param name="stiffness">Inverse of the receptances, over the same dofs.</param>
internal sealed class InstalledEvidence(InstalledMounts installed, TiledMatrix stiffness, MountEnds mount)
{
    /// <summary>Mean of the two transfer stiffnesses of a direction, minus the off-diagonal terms.</summary>
    public Complex[] TransferOf(Direction direction)
    {
        Complex[] there = Between(mount.First, direction, mount.Second, direction);
        Complex[] back = Between(mount.Second, direction, mount.First, direction);
        return [.. there.Zip(back, (a, b) => -(a + b) / 2)];
    }

    public MountEvidence Of(Direction direction)
    {
        Complex[] own = TransferOf(direction);
        Complex[] there = Between(mount.First, direction, mount.Second, direction);
        Complex[] back = Between(mount.Second, direction, mount.First, direction);
        bool isAlone = installed.Dofs.Count == 2;
        return new MountEvidence(
            direction,
            Share(own, [[.. there.Zip(back, (a, b) => a - b)]]),
            Share(own, Others(direction)),
            installed.Mounts.Count == 1 ? double.NaN : Share(own, Leaks(direction)),
            isAlone ? double.NaN : Share(own, [[.. AloneOf(direction).Zip(own, (a, b) => a - b)]]));
    }

    private Complex[][] Others(Direction direction) =>
        [.. installed.DirectionsOf(mount)
            .Where(other => other != direction && IsLikeKind(other, direction))
            .Select(other => Between(mount.First, direction, mount.Second, other))];

    private Complex[][] Leaks(Direction direction) =>
        [.. installed.Mounts
            .Where(other => other != mount)
            .SelectMany(other => installed.DirectionsOf(other)
                .Where(theirs => IsLikeKind(theirs, direction))
                .Select(theirs => Between(mount.First, direction, other.Second, theirs)))];

    /// <summary>Translations and rotations have different units and are not compared.</summary>
    private static bool IsLikeKind(Direction one, Direction other) => one >= Direction.RX == other >= Direction.RX;

    /// <summary>The transfer stiffness from the two dofs of a direction alone: minus the off-diagonal term of the 2×2 inverse.</summary>
    private IEnumerable<Complex> AloneOf(Direction direction)
    {
        int first = installed.IndexOf(mount.First, direction);
        int second = installed.IndexOf(mount.Second, direction);
        TiledMatrix y = installed.Receptance;
        for (int line = 0; line < installed.Axis.Count; line++)
        {
            Complex transfer = (y[line, first, second] + y[line, second, first]) / 2;
            yield return transfer / (y[line, first, first] * y[line, second, second] - transfer * transfer);
        }
    }

    private Complex[] Between(string point, Direction direction, string otherPoint, Direction otherDirection) =>
        stiffness.GatherSpectrum(installed.IndexOf(point, direction), installed.IndexOf(otherPoint, otherDirection));

    /// <summary>Median over the lines of the root of the summed squares of spectra, relative to the mount's own stiffness.</summary>
    private static double Share(Complex[] own, Complex[][] spectra)
    {
        double[] sorted = [.. own.Select((k, line) => Math.Sqrt(spectra.Sum(spectrum => Square(spectrum[line])) / Square(k))).Order()];
        return (sorted[(sorted.Length - 1) / 2] + sorted[sorted.Length / 2]) / 2;
    }

    private static double Square(Complex value) => value.Real * value.Real + value.Imaginary * value.Imaginary;
}
