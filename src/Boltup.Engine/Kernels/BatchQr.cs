using Boltup.Engine.Spectra;

namespace Boltup.Engine.Kernels;

/// <summary>
/// Least squares at the 8 lines of a tile at once: min ‖A·X − B‖ by Householder QR, a factorisation per lane. Buffers are allocated
/// once; not for use by several threads at a time.
/// </summary>
/// <remarks>
/// Backward stable column by column (Higham, Accuracy and Stability of Numerical Algorithms, theorem 20.3). A lane whose matrix has
/// dependent columns or holds NaN gives NaN, infinity or numbers without meaning in that lane only, and is named by
/// <see cref="DeficientLanes"/>.
/// </remarks>
public sealed unsafe class BatchQr
{
    private readonly QrKernel _kernel;
    private readonly int _maxRows;
    private readonly int _maxColumns;
    private int _rows;
    private int _columns;

    /// <param name="maxRows">Largest number of rows that will be factored.</param>
    /// <param name="maxColumns">Largest number of columns.</param>
    /// <param name="variant">Body of the kernel; by default the one that <see cref="KernelChoice"/> names.</param>
    public BatchQr(int maxRows, int maxColumns, KernelVariant? variant = null)
    {
        _kernel = QrKernel.Create(variant ?? KernelChoice.Current, maxRows, maxColumns);
        (_maxRows, _maxColumns) = (maxRows, maxColumns);
    }

    /// <summary>
    /// One bit per lane whose columns are dependent to working precision: a diagonal entry of R is at most rows·ε of the largest, or no
    /// finite number.
    /// </summary>
    public byte DeficientLanes => _kernel.DeficientLanes;

    /// <summary>Factors the matrices of a tile; the tile is not changed.</summary>
    /// <param name="tile">rows × columns entries, rows ≥ columns.</param>
    public void Factor(ReadOnlySpan<double> tile, int rows, int columns)
    {
        TileSize.Require(tile, rows, columns);
        TileSize.RequireTall(rows, columns, _maxRows, _maxColumns);
        (_rows, _columns) = (rows, columns);
        fixed (double* matrix = tile)
        {
            _kernel.Factor(matrix, rows, columns);
        }
    }

    /// <summary>Solves for some right-hand sides with the matrices factored last.</summary>
    /// <param name="rightSides">rows × count entries.</param>
    /// <param name="solution">Receives columns × count entries.</param>
    public void Solve(ReadOnlySpan<double> rightSides, int count, Span<double> solution)
    {
        TileSize.Require(rightSides, _rows, count);
        TileSize.Require(solution, _columns, count);
        fixed (double* b = rightSides, x = solution)
        {
            _kernel.Solve(b, count, x);
        }
    }
}
