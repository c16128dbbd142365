using Boltup.Engine.Spectra;

namespace Boltup.Engine.MountIdentification;

/// <summary>Receptances of an assembled installation at both ends of its mounts.</summary>
/// <param name="Dofs">What rows and columns are, in order: end after end.</param>
/// <param name="Receptance">Square over the dofs, m/N.</param>
/// <param name="Mounts">The mounts, each with dofs of the same directions at its two ends.</param>
public sealed record InstalledMounts(FrequencyAxis Axis, IReadOnlyList<Dof> Dofs, TiledMatrix Receptance, IReadOnlyList<MountEnds> Mounts)
{
    /// <summary>Directions in which a mount is measured at both of its ends.</summary>
    public IReadOnlyList<Direction> DirectionsOf(MountEnds mount) =>
        [.. Dofs.Where(dof => dof.Point == mount.First).Select(dof => dof.Direction)];

    internal int IndexOf(string point, Direction direction) => Dofs.Index().First(item => item.Item == new Dof(point, direction)).Index;
}
