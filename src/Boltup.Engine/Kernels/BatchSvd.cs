using Boltup.Engine.Spectra;

namespace Boltup.Engine.Kernels;

/// <summary>
/// Singular value decompositions A = U·Σ·Vᴴ at the 8 lines of a tile at once: Householder QR, then one-sided Jacobi rotations on Rᴴ
/// (Hestenes 1958; Drmač, Veselić, SIAM J. Matrix Anal. Appl. 29 (2008) 1322). Buffers are allocated once; not for use by several
/// threads at a time.
/// </summary>
/// <remarks>
/// Neither U nor V is formed: a filtered inverse is applied as V·diag(gains)·(Uᴴ·B), with gains 1/σ for the pseudo-inverse, 0 for a
/// truncated value, σ/(σ²+λ²) for Tikhonov. Singular values come in no order, the same for values, coefficients and gains. A lane with
/// NaN gives NaN in that lane only. Not for the hazard of underflow: matrices are scaled per lane by a power of two.
/// </remarks>
public sealed unsafe class BatchSvd
{
    private readonly SvdKernel _kernel;
    private readonly TileBuffer _singularValues;
    private readonly int _maxRows;
    private readonly int _maxColumns;
    private int _rows;
    private int _columns;

    /// <param name="maxRows">Largest number of rows that will be factored.</param>
    /// <param name="maxColumns">Largest number of columns.</param>
    /// <param name="variant">Body of the kernel; by default the one that <see cref="KernelChoice"/> names.</param>
    public BatchSvd(int maxRows, int maxColumns, KernelVariant? variant = null)
    {
        _kernel = SvdKernel.Create(variant ?? KernelChoice.Current, maxRows, maxColumns);
        _singularValues = new TileBuffer(maxColumns * Tiling.Lanes);
        (_maxRows, _maxColumns) = (maxRows, maxColumns);
    }

    /// <summary>columns × 8 lanes, in no order.</summary>
    public ReadOnlySpan<double> SingularValues => _singularValues.Span[..(_columns * Tiling.Lanes)];

    /// <summary>Factors the matrices of a tile; the tile is not changed.</summary>
    /// <param name="tile">rows × columns entries, rows ≥ columns.</param>
    public void Factor(ReadOnlySpan<double> tile, int rows, int columns)
    {
        TileSize.Require(tile, rows, columns);
        TileSize.RequireTall(rows, columns, _maxRows, _maxColumns);
        (_rows, _columns) = (rows, columns);
        fixed (double* matrix = tile, values = _singularValues.Span)
        {
            _kernel.Factor(matrix, rows, columns, values);
        }
    }

    /// <summary>Writes Uᴴ·B: what each singular direction carries of some right-hand sides.</summary>
    /// <param name="rightSides">rows × count entries.</param>
    /// <param name="coefficients">Receives columns × count entries.</param>
    public void Project(ReadOnlySpan<double> rightSides, int count, Span<double> coefficients)
    {
        TileSize.Require(rightSides, _rows, count);
        TileSize.Require(coefficients, _columns, count);
        fixed (double* b = rightSides, c = coefficients)
        {
            _kernel.Project(b, count, c);
        }
    }

    /// <summary>Writes V·diag(gains)·C.</summary>
    /// <param name="gains">columns × 8 lanes, in the order of <see cref="SingularValues"/>.</param>
    /// <param name="coefficients">columns × count entries from <see cref="Project"/>.</param>
    /// <param name="result">Receives columns × count entries.</param>
    public void Combine(ReadOnlySpan<double> gains, ReadOnlySpan<double> coefficients, int count, Span<double> result)
    {
        TileSize.Require(coefficients, _columns, count);
        TileSize.Require(result, _columns, count);
        ArgumentOutOfRangeException.ThrowIfLessThan(gains.Length, _columns * Tiling.Lanes);
        fixed (double* g = gains, c = coefficients, x = result)
        {
            _kernel.Combine(g, c, count, x);
        }
    }

    /// <summary>Largest over smallest singular value per lane; infinity where the smallest is zero.</summary>
    /// <param name="lanes">Receives 8 condition numbers.</param>
    public void Condition(Span<double> lanes)
    {
        ReadOnlySpan<double> values = SingularValues;
        for (int lane = 0; lane < Tiling.Lanes; lane++)
        {
            double largest = 0, smallest = double.PositiveInfinity;
            for (int i = lane; i < values.Length; i += Tiling.Lanes)
            {
                largest = Math.Max(largest, values[i]);
                smallest = Math.Min(smallest, values[i]);
            }

            lanes[lane] = largest / smallest;
        }
    }
}
