using Boltup.Engine.Kernels;
using Boltup.Engine.Mounts;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Coupling;

/// <summary>Z⁻¹ of mounts, displacement per force, at the lines of a tile. Holds its own workspace: one per thread.</summary>
internal sealed class MountCompliance
{
    private const int LargestMount = BothEnds.LargestOrder;

    private readonly TiledMatrix _stiffness = new(Tiling.Lanes, LargestMount, LargestMount);
    private readonly TiledMatrix _compliance = new(Tiling.Lanes, LargestMount, LargestMount);
    private readonly BatchLu _lu = new(LargestMount);

    /// <summary>n×n entries, n the order of the mount; valid until the next call.</summary>
    public ReadOnlySpan<double> Of(MountLaw mount, FrequencyAxis axis, int tile)
    {
        int size = mount.Order;
        int length = size * size * Tiling.EntryLength;
        Span<double> stiffness = _stiffness.Tile(0)[..length];
        Span<double> compliance = _compliance.Tile(0)[..length];
        mount.FillStiffness(axis, tile, stiffness);
        TileEntry.FillIdentity(compliance, size);
        if (mount.IsDiagonal)
        {
            TileEntry.InvertDiagonal(stiffness, compliance, size);
        }
        else
        {
            _lu.Factor(stiffness, size);
            _lu.Solve(compliance, size);
        }

        return compliance;
    }
}
