using System.Runtime.CompilerServices;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Kernels;

/// <summary>
/// Householder QR (Golub, Van Loan, Matrix Computations, section 5.2) on 8 matrices at once: H = I − τ·v·vᴴ with
/// v = x + e^{j·arg x₀}‖x‖·e₀ and τ = 1/(‖x‖² + |x₀|‖x‖).
/// </summary>
/// <remarks>
/// Layout: the tile is copied column by column with an odd stride, each column contiguous; below and on the diagonal stands v, above it R,
/// the diagonal of R apart. Lanes: one matrix per lane, no pivoting, so no lane waits for another and NaN stays where it is. Right-hand
/// sides are taken four at a time. Hazard: matrices are scaled by a power of two per lane; v has no cancellation by the choice of sign.
/// </remarks>
[SkipLocalsInit]
internal sealed unsafe class VectorQr<T> : QrKernel
    where T : unmanaged, ILanes<T>
{
    private const int Entry = Tiling.EntryLength;
    private const int Imaginary = Tiling.Lanes;
    private const int ChunkColumns = 4;

    private readonly TileBuffer _matrix;
    private readonly TileBuffer _diagonal;
    private readonly TileBuffer _inverseDiagonal;
    private readonly TileBuffer _factors;
    private readonly TileBuffer _chunk;
    private readonly TileBuffer _scale = new(Tiling.Lanes);
    private readonly int[][] _orders;
    private int _rows;
    private int _columns;

    public VectorQr(int maxRows, int maxColumns)
    {
        _matrix = new TileBuffer(maxColumns * StrideOf(maxRows));
        _diagonal = new TileBuffer(maxColumns * Entry);
        _inverseDiagonal = new TileBuffer(maxColumns * Entry);
        _factors = new TileBuffer(maxColumns * Tiling.Lanes);
        _chunk = new TileBuffer(ChunkColumns * StrideOf(maxRows));
        _orders = [.. Enumerable.Range(0, Tiling.Lanes / T.Count).Select(_ => new int[maxColumns])];
    }

    /// <summary>The powers of two by which the lanes were multiplied.</summary>
    public ReadOnlySpan<double> Scale => _scale.Span;

    /// <summary>For each lane group the column of the matrix that stands at each place.</summary>
    public int[] OrderOf(int lane) => _orders[lane / T.Count];

    public override void Factor(double* tile, int rows, int columns) => Factor(tile, rows, columns, isPivoted: false);

    /// <param name="isPivoted">
    /// Whether the largest of the remaining columns is taken next, so that R falls from row to row; the lanes of a register go together, as
    /// neighbouring lines look alike.
    /// </param>
    public void Factor(double* tile, int rows, int columns, bool isPivoted)
    {
        (_rows, _columns) = (rows, columns);
        fixed (double* matrix = _matrix.Span, scale = _scale.Span, diagonal = _diagonal.Span, factors = _factors.Span)
        {
            for (int lane = 0; lane < Tiling.Lanes; lane += T.Count)
            {
                LaneScale.Of<T>(tile + lane, rows * columns, scale + lane);
                CopyIn(tile + lane, matrix + lane, T.Load(scale + lane));
                int[] order = OrderOf(lane);
                for (int k = 0; k < columns; k++)
                {
                    order[k] = k;
                }

                for (int k = 0; k < columns; k++)
                {
                    if (isPivoted)
                    {
                        BringLargest(matrix + lane, order, k);
                    }

                    double* v = matrix + lane + (nint)k * StrideOf(rows) + (nint)k * Entry;
                    T factor = MakeReflector(v, rows - k, diagonal + lane + (nint)k * Entry);
                    T.Store(factor, factors + lane + (nint)k * Tiling.Lanes);
                    ColumnKernel<T>.Reflect(v, factor, v + StrideOf(rows), StrideOf(rows), columns - k - 1, rows - k);
                }
            }
        }

        InvertDiagonal();
    }

    public override void Solve(double* rightSides, int count, double* solution)
    {
        fixed (double* chunk = _chunk.Span)
        {
            for (int first = 0; first < count; first += ChunkColumns)
            {
                int columns = Math.Min(ChunkColumns, count - first);
                Transform(rightSides + (nint)first * Entry, count, columns, chunk);
                for (int column = 0; column < columns; column++)
                {
                    double* y = chunk + (nint)column * StrideOf(_rows);
                    SolveTriangle(y);
                    CopyOut(y, solution + (nint)(first + column) * Entry, count);
                }
            }
        }
    }

    /// <summary>Writes Qᴴ·B for up to four columns, column after column <see cref="StrideOf"/> doubles apart.</summary>
    /// <param name="rightSides">First of these columns in a tile of <paramref name="count"/> columns.</param>
    public void Transform(double* rightSides, int count, int columns, double* chunk)
    {
        fixed (double* matrix = _matrix.Span, factors = _factors.Span)
        {
            CopyChunk(rightSides, count, columns, chunk);
            for (int lane = 0; lane < Tiling.Lanes; lane += T.Count)
            {
                for (int k = 0; k < _columns; k++)
                {
                    double* v = matrix + lane + (nint)k * StrideOf(_rows) + (nint)k * Entry;
                    T factor = T.Load(factors + lane + (nint)k * Tiling.Lanes);
                    ColumnKernel<T>.Reflect(v, factor, chunk + lane + (nint)k * Entry, StrideOf(_rows), columns, _rows - k);
                }
            }
        }
    }

    /// <summary>Doubles from one column to the next: odd in entries, so that columns do not fall into one cache set.</summary>
    public static int StrideOf(int rows) => (rows | 1) * Entry;

    /// <summary>Writes Rᴴ of the scaled matrices, a lower triangle, column after column.</summary>
    /// <param name="stride">Doubles from one column of the target to the next.</param>
    public void CopyTriangle(double* target, int stride)
    {
        fixed (double* matrix = _matrix.Span, diagonal = _diagonal.Span)
        {
            for (int column = 0; column < _columns; column++)
            {
                double* to = target + (nint)column * stride;
                new Span<double>(to, column * Entry).Clear();
                Conjugate(diagonal + (nint)column * Entry, to + (nint)column * Entry);
                for (int row = column + 1; row < _columns; row++)
                {
                    Conjugate(matrix + (nint)row * StrideOf(_rows) + (nint)column * Entry, to + (nint)row * Entry);
                }
            }
        }
    }

    private static void Conjugate(double* from, double* to)
    {
        for (int lane = 0; lane < Tiling.Lanes; lane++)
        {
            to[lane] = from[lane];
            to[Imaginary + lane] = -from[Imaginary + lane];
        }
    }

    private void CopyIn(double* tile, double* matrix, T scale)
    {
        for (int row = 0; row < _rows; row++)
        {
            for (int column = 0; column < _columns; column++)
            {
                double* from = tile + (nint)(row * _columns + column) * Entry;
                BlockKernel<T>.Store(
                    matrix + (nint)column * StrideOf(_rows) + (nint)row * Entry, T.Load(from) * scale, T.Load(from + Imaginary) * scale);
            }
        }
    }

    /// <summary>Exchanges column k with the one that is largest from row k on, over the lanes of the register together.</summary>
    private void BringLargest(double* matrix, int[] order, int k)
    {
        int largest = k;
        double most = -1;
        for (int column = k; column < _columns; column++)
        {
            double sum = SumOf(ColumnKernel<T>.SquaredNorm(matrix + (nint)column * StrideOf(_rows) + (nint)k * Entry, _rows - k));
            (largest, most) = sum > most ? (column, sum) : (largest, most);
        }

        if (largest != k)
        {
            (order[k], order[largest]) = (order[largest], order[k]);
            Exchange(matrix + (nint)k * StrideOf(_rows), matrix + (nint)largest * StrideOf(_rows));
        }
    }

    private static double SumOf(T lanes)
    {
        double* each = stackalloc double[Tiling.Lanes];
        T.Store(lanes, each);
        double sum = 0;
        for (int lane = 0; lane < T.Count; lane++)
        {
            // A lane without numbers has no say.
            sum += double.IsFinite(each[lane]) ? each[lane] : 0;
        }

        return sum;
    }

    private void Exchange(double* first, double* second)
    {
        for (nint at = 0; at < (nint)_rows * Entry; at += Tiling.Lanes)
        {
            T kept = T.Load(first + at);
            T.Store(T.Load(second + at), first + at);
            T.Store(kept, second + at);
        }
    }

    /// <summary>Turns a column into v and writes the diagonal entry of R; returns τ, zero for a column of zeros.</summary>
    private static T MakeReflector(double* v, int rows, double* diagonal)
    {
        T one = T.Broadcast(1), zero = default;
        T r = T.Load(v), i = T.Load(v + Imaginary);
        T norm = T.Sqrt(ColumnKernel<T>.SquaredNorm(v, rows));
        T size = T.Sqrt(T.MultiplyAdd(i, i, r * r));
        T turns = T.GreaterThan(size, zero);
        T cosine = T.Select(turns, r / size, one), sine = T.Select(turns, i / size, zero);
        BlockKernel<T>.Store(v, T.MultiplyAdd(cosine, norm, r), T.MultiplyAdd(sine, norm, i));
        BlockKernel<T>.Store(diagonal, zero - cosine * norm, zero - sine * norm);
        T empty = T.GreaterThan(T.Broadcast(double.Epsilon), norm);
        return T.Select(empty, zero, one / (norm * (norm + size)));
    }

    private void InvertDiagonal()
    {
        Span<double> diagonal = _diagonal.Span, inverse = _inverseDiagonal.Span;
        DeficientLanes = 0;
        for (int lane = 0; lane < Tiling.Lanes; lane++)
        {
            double largest = 0, smallest = double.PositiveInfinity;
            for (int at = lane; at < _columns * Entry; at += Entry)
            {
                double r = diagonal[at], i = diagonal[at + Imaginary];
                double square = r * r + i * i;
                (inverse[at], inverse[at + Imaginary]) = (r / square, -i / square);
                (largest, smallest) = (Math.Max(largest, square), Math.Min(smallest, square));
            }

            DeficientLanes |= Rank.IsFull(Math.Sqrt(largest), Math.Sqrt(smallest), _rows) ? (byte)0 : (byte)(1 << lane);
        }
    }

    private void CopyChunk(double* rightSides, int count, int columns, double* chunk)
    {
        for (int row = 0; row < _rows; row++)
        {
            for (int column = 0; column < columns; column++)
            {
                new ReadOnlySpan<double>(rightSides + ((nint)row * count + column) * Entry, Entry)
                    .CopyTo(new Span<double>(chunk + (nint)column * StrideOf(_rows) + (nint)row * Entry, Entry));
            }
        }
    }

    private void SolveTriangle(double* y)
    {
        fixed (double* matrix = _matrix.Span, inverse = _inverseDiagonal.Span, scale = _scale.Span)
        {
            for (int lane = 0; lane < Tiling.Lanes; lane += T.Count)
            {
                for (int k = _columns - 1; k >= 0; k--)
                {
                    double* entry = y + lane + (nint)k * Entry;
                    T r = T.Load(entry), i = T.Load(entry + Imaginary);
                    T dr = T.Load(inverse + lane + (nint)k * Entry), di = T.Load(inverse + lane + (nint)k * Entry + Imaginary);
                    T xr = T.MultiplySubtract(i, di, r * dr), xi = T.MultiplyAdd(r, di, i * dr);
                    ColumnKernel<T>.Subtract(matrix + lane + (nint)k * StrideOf(_rows), xr, xi, y + lane, k);
                    T factor = T.Load(scale + lane);
                    BlockKernel<T>.Store(entry, xr * factor, xi * factor);
                }
            }
        }
    }

    private void CopyOut(double* y, double* solution, int count)
    {
        for (int row = 0; row < _columns; row++)
        {
            new ReadOnlySpan<double>(y + (nint)row * Entry, Entry).CopyTo(new Span<double>(solution + (nint)row * count * Entry, Entry));
        }
    }
}
