using Boltup.Engine.Spectra;

namespace Boltup.Engine.Mounts;

/// <summary>
/// The dynamic stiffness of a resilient element between two points, in the axes of the assembly: force over displacement, N/m (N·m/rad
/// for rotations), complex, with Im ≥ 0 for an element that dissipates (e^{+jωt}). An element without mass effect passes on the force
/// that it receives: one stiffness times the relative displacement. One with mass effect (<see cref="IsTwoPort"/>) has a force of its own
/// at each end.
/// </summary>
public abstract class MountLaw
{
    /// <summary>Directions that the mount connects, in order; a direction of zero stiffness is not among them.</summary>
    public abstract IReadOnlyList<Direction> Directions { get; }

    /// <summary>Whether no direction is coupled with another.</summary>
    public abstract bool IsDiagonal { get; }

    /// <summary>Whether the forces at the two ends differ.</summary>
    public virtual bool IsTwoPort => false;

    /// <summary>Rows of the stiffness: the number of directions, twice that where the forces at the two ends differ.</summary>
    public int Order => IsTwoPort ? 2 * Directions.Count : Directions.Count;

    /// <summary>Frequency band in Hz over which the law is known; null when it holds at any frequency.</summary>
    public virtual (double FromHz, double ToHz)? Band => null;

    /// <summary>Largest loss factor that the law holds constant over frequency; 0 when it has none.</summary>
    public virtual double ConstantLossFactor => 0;

    /// <summary>
    /// Writes the stiffness at the 8 lines of a tile, n×n entries, n the order. Of a two-port: rows are the force that the first point
    /// exerts on the mount in each direction, then the force that the mount exerts on the second point; columns are the displacement of
    /// the first point, then minus that of the second. In terms of ISO 10846 that is k11, −k12 over −k21, k22.
    /// </summary>
    public abstract void FillStiffness(FrequencyAxis axis, int tile, Span<double> stiffness);

    /// <summary>The frequency of a lane; lanes beyond the last line repeat it, as <see cref="Tiling"/> says.</summary>
    protected static double HertzOf(FrequencyAxis axis, int tile, int lane) =>
        axis[Math.Min(tile * Tiling.Lanes + lane, axis.Count - 1)];
}
