using Boltup.Engine.Coupling;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Mounts;

/// <summary>The stiffness of any mount as that of a two-port over chosen directions, as composed mounts need it.</summary>
internal static class BothEnds
{
    /// <summary>Order of the largest two-port: six directions at both ends.</summary>
    public const int LargestOrder = 12;

    /// <summary>Adds the stiffness at the lines of a tile, in the form of <see cref="MountLaw.FillStiffness"/> for a two-port.</summary>
    /// <param name="directions">Directions of the target; those that the mount has beyond them are left out.</param>
    public static void Add(MountLaw mount, IReadOnlyList<Direction> directions, FrequencyAxis axis, int tile, Span<double> target)
    {
        Span<double> own = stackalloc double[mount.Order * mount.Order * Tiling.EntryLength];
        mount.FillStiffness(axis, tile, own);
        for (int row = 0; row < 2 * directions.Count; row++)
        {
            for (int column = 0; column < 2 * directions.Count; column++)
            {
                int from = PlaceOf(mount, directions, row);
                int to = PlaceOf(mount, directions, column);
                if (from >= 0 && to >= 0)
                {
                    TileEntry.AddScaled(target, row * 2 * directions.Count + column, own, from * mount.Order + to, 1);
                }
            }
        }
    }

    /// <summary>Row of the mount's own stiffness that stands at a row of the two-port, or −1. A one-port has the same at both ends.</summary>
    private static int PlaceOf(MountLaw mount, IReadOnlyList<Direction> directions, int row)
    {
        int own = IndexOf(mount.Directions, directions[row % directions.Count]);
        return own >= 0 && mount.IsTwoPort && row >= directions.Count ? mount.Directions.Count + own : own;
    }

    private static int IndexOf(IReadOnlyList<Direction> directions, Direction wanted)
    {
        for (int i = 0; i < directions.Count; i++)
        {
            if (directions[i] == wanted)
            {
                return i;
            }
        }

        return -1;
    }
}
