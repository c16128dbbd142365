using Boltup.Engine.Coupling;
using Boltup.Engine.Mounts;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Prediction;

/// <summary>Evaluates the mounts of an assembly for people to look at.</summary>
internal static class MountSpectra
{
    /// <summary>Every mount once, in the order of the joints.</summary>
    public static IReadOnlyList<MountSpectrum> Of(AssemblyModel assembly) =>
        [.. assembly.Joints
            .Where(joint => joint.Mount is { Order: > 0 })
            .DistinctBy(joint => joint.MountName ?? joint.Name)
            .Select(joint => new MountSpectrum(joint.MountName ?? joint.Name, TermsOf(joint.Mount!, assembly.Axis)))];

    private static MountTerm[] TermsOf(MountLaw mount, FrequencyAxis axis)
    {
        var stiffness = new TiledMatrix(axis.Count, mount.Order, mount.Order);
        for (int tile = 0; tile < axis.TileCount; tile++)
        {
            mount.FillStiffness(axis, tile, stiffness.Tile(tile));
        }

        int count = mount.Directions.Count;
        return [.. mount.Directions.SelectMany((direction, i) => PlacesOf(mount, i, count)
            .Select(place => new MountTerm(direction, place.Name, stiffness.GatherSpectrum(place.Row, place.Column))))];
    }

    private static IEnumerable<(string Name, int Row, int Column)> PlacesOf(MountLaw mount, int direction, int count) => mount.IsTwoPort
        ? [("k11", direction, direction), ("−k21", count + direction, direction), ("k22", count + direction, count + direction)]
        : [("", direction, direction)];
}
