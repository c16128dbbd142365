using Boltup.Engine.Spectra;

namespace Boltup.Engine.Mounts;

/// <summary>
/// The dynamic stiffness of a resilient element between two points, in the axes of the assembly: force over relative
/// displacement, N/m (N·m/rad for rotations), complex, with Im ≥ 0 for an element that dissipates (e^{+jωt}).
/// </summary>
public abstract class MountLaw
{
    /// <summary>Directions that the mount connects, in order; a direction of zero stiffness is not among them.</summary>
    public abstract IReadOnlyList<Direction> Directions { get; }

    /// <summary>Whether no direction is coupled with another.</summary>
    public abstract bool IsDiagonal { get; }

    /// <summary>Frequency band in Hz over which the law is known; null when it holds at any frequency.</summary>
    public virtual (double FromHz, double ToHz)? Band => null;

    /// <summary>Writes the stiffness at the 8 lines of a tile: n×n entries, n the number of directions.</summary>
    public abstract void FillStiffness(FrequencyAxis axis, int tile, Span<double> stiffness);

    /// <summary>The frequency of a lane; lanes beyond the last line repeat it, as <see cref="Tiling"/> says.</summary>
    protected static double HertzOf(FrequencyAxis axis, int tile, int lane) =>
        axis[Math.Min(tile * Tiling.Lanes + lane, axis.Count - 1)];
}
