using Boltup.Engine.Spectra;

namespace Boltup.Engine.Kernels;

/// <summary>
/// Solves square complex systems at the 8 lines of a tile at once: P·A = L·U with partial pivoting, a factorisation per lane. Buffers are
/// allocated once; not for use by several threads at a time.
/// </summary>
/// <remarks>
/// A lane whose matrix is singular or holds NaN gives NaN or infinity in that lane only. Backward error of a solution is a small multiple
/// of n·ε (Higham, Accuracy and Stability of Numerical Algorithms, theorem 9.4).
/// </remarks>
public sealed unsafe class BatchLu
{
    private readonly LuKernel _kernel;
    private readonly int _maxOrder;
    private readonly TileBuffer _probe;
    private int _order;

    /// <param name="maxOrder">Largest order that will be factored.</param>
    /// <param name="variant">Body of the kernel; by default the one that <see cref="KernelChoice"/> names.</param>
    public BatchLu(int maxOrder, KernelVariant? variant = null)
    {
        _kernel = LuKernel.Create(variant ?? KernelChoice.Current, maxOrder);
        _maxOrder = maxOrder;
        _probe = new TileBuffer(maxOrder * Tiling.EntryLength);
    }

    /// <summary>One bit per lane whose matrix is singular: a pivot is zero or no finite number.</summary>
    public byte SingularLanes => _kernel.SingularLanes;

    /// <summary>Factors the matrices of a tile; the tile is not changed.</summary>
    /// <param name="tile">order × order entries.</param>
    public void Factor(ReadOnlySpan<double> tile, int order)
    {
        ArgumentOutOfRangeException.ThrowIfGreaterThan(order, _maxOrder);
        TileSize.Require(tile, order, order);
        _order = order;
        fixed (double* matrix = tile)
        {
            _kernel.Factor(matrix, order);
        }
    }

    /// <summary>Replaces B by A⁻¹B.</summary>
    /// <param name="tile">order × columns entries.</param>
    public void Solve(Span<double> tile, int columns)
    {
        TileSize.Require(tile, _order, columns);
        fixed (double* rightHandSides = tile)
        {
            _kernel.Solve(rightHandSides, columns);
        }
    }

    /// <summary>Replaces B by A⁻ᵀB; the transpose is plain, not conjugate.</summary>
    /// <param name="tile">order × columns entries.</param>
    public void SolveTransposed(Span<double> tile, int columns)
    {
        TileSize.Require(tile, _order, columns);
        fixed (double* rightHandSides = tile)
        {
            _kernel.SolveTransposed(rightHandSides, columns);
        }
    }

    /// <summary>
    /// Estimates the 1-norm condition number ‖A‖₁·‖A⁻¹‖₁ of each lane: a lower bound that is nearly always within a factor of three
    /// (Hager, SIAM J. Sci. Stat. Comput. 5 (1984) 311; Higham, ACM TOMS 14 (1988) 381). Infinity in singular lanes.
    /// </summary>
    /// <param name="tile">The matrices that were factored.</param>
    /// <param name="lanes">Receives 8 condition numbers.</param>
    public void EstimateCondition(ReadOnlySpan<double> tile, Span<double> lanes)
    {
        TileSize.Require(tile, _order, _order);
        var estimate = new InverseNormEstimate(this, _probe.Span[..(_order * Tiling.EntryLength)], _order);
        estimate.Run(lanes);
        Span<double> norm = stackalloc double[Tiling.Lanes];
        OneNorm.Of(tile, _order, norm);
        for (int lane = 0; lane < Tiling.Lanes; lane++)
        {
            double condition = norm[lane] * lanes[lane];
            lanes[lane] = (SingularLanes >> lane & 1) != 0 || double.IsNaN(condition) ? double.PositiveInfinity : condition;
        }
    }
}
