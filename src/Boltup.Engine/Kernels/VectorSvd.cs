using System.Runtime.CompilerServices;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Kernels;

/// <summary>
/// One-sided Jacobi on Rᴴ after a Householder QR (Hestenes 1958; Drmač, Veselić 2008; Golub, Van Loan, section 8.6), on 8 matrices at
/// once: columns p and q of Rᴴ are rotated until all are orthogonal, Rᴴ·J = V·Σ, so that A = (Q·J)·Σ·Vᴴ.
/// </summary>
/// <remarks>
/// Layout: a column holds its n entries of Rᴴ and under them its n entries of J, so that one loop turns both. Lanes: each lane has its own
/// angle; a lane whose pair is orthogonal turns by nothing; the sweeps end when no lane turned. Hazard: cosines below n·ε count as
/// orthogonal; NaN compares as orthogonal, so it ends the sweeps and stays in its lane.
/// </remarks>
[SkipLocalsInit]
internal sealed unsafe class VectorSvd<T> : SvdKernel
    where T : unmanaged, ILanes<T>
{
    private const int Entry = Tiling.EntryLength;
    private const int Imaginary = Tiling.Lanes;
    private const int ChunkColumns = 4;

    private readonly VectorQr<T> _qr;
    private readonly TileBuffer _columns;
    private readonly TileBuffer _inverseNorms;
    private readonly TileBuffer _chunk;
    private int _rows;
    private int _order;

    public VectorSvd(int maxRows, int maxColumns)
    {
        _qr = new VectorQr<T>(maxRows, maxColumns);
        _columns = new TileBuffer(maxColumns * StrideOf(maxColumns));
        _inverseNorms = new TileBuffer(maxColumns * Tiling.Lanes);
        _chunk = new TileBuffer(ChunkColumns * VectorQr<T>.StrideOf(maxRows));
    }

    public override void Factor(double* tile, int rows, int columns, double* singularValues)
    {
        (_rows, _order) = (rows, columns);
        _qr.Factor(tile, rows, columns);
        fixed (double* c = _columns.Span)
        {
            _qr.CopyTriangle(c, StrideOf(_order));
            SetIdentity(c);
            for (int lane = 0; lane < Tiling.Lanes; lane += T.Count)
            {
                int sweep = 0;
                while (Sweep(c + lane) && ++sweep < MaxSweeps)
                {
                }
            }

            MeasureColumns(c, singularValues);
        }
    }

    public override void Project(double* rightSides, int count, double* coefficients)
    {
        fixed (double* c = _columns.Span, chunk = _chunk.Span)
        {
            for (int first = 0; first < count; first += ChunkColumns)
            {
                int columns = Math.Min(ChunkColumns, count - first);
                _qr.Transform(rightSides + (nint)first * Entry, count, columns, chunk);
                for (int i = 0; i < columns * _order; i++)
                {
                    int column = i / _order, direction = i % _order;
                    double* j = c + (nint)direction * StrideOf(_order) + (nint)_order * Entry;
                    double* target = coefficients + ((nint)direction * count + first + column) * Entry;
                    for (int lane = 0; lane < Tiling.Lanes; lane += T.Count)
                    {
                        ColumnKernel<T>.Dot(j + lane, chunk + lane + (nint)column * VectorQr<T>.StrideOf(_rows), _order, out T re, out T im);
                        BlockKernel<T>.Store(target + lane, re, im);
                    }
                }
            }
        }
    }

    public override void Combine(double* gains, double* coefficients, int count, double* result)
    {
        fixed (double* c = _columns.Span, inverse = _inverseNorms.Span, sum = _chunk.Span)
        {
            for (int column = 0; column < count; column++)
            {
                new Span<double>(sum, _order * Entry).Clear();
                for (int i = 0; i < _order * Tiling.Lanes; i += T.Count)
                {
                    int direction = i / Tiling.Lanes, lane = i % Tiling.Lanes;
                    double* factor = coefficients + ((nint)direction * count + column) * Entry + lane;
                    T gain = default(T) - T.Load(gains + i) * T.Load(inverse + i);
                    double* v = c + (nint)direction * StrideOf(_order) + lane;
                    ColumnKernel<T>.Subtract(v, T.Load(factor) * gain, T.Load(factor + Imaginary) * gain, sum + lane, _order);
                }

                for (int row = 0; row < _order; row++)
                {
                    new ReadOnlySpan<double>(sum + (nint)row * Entry, Entry)
                        .CopyTo(new Span<double>(result + ((nint)row * count + column) * Entry, Entry));
                }
            }
        }
    }

    private static int StrideOf(int order) => (2 * order + 1) * Entry;

    private void SetIdentity(double* c)
    {
        for (int column = 0; column < _order; column++)
        {
            double* j = c + (nint)column * StrideOf(_order) + (nint)_order * Entry;
            new Span<double>(j, _order * Entry).Clear();
            new Span<double>(j + (nint)column * Entry, Tiling.Lanes).Fill(1);
        }
    }

    /// <returns>Whether any lane turned any pair.</returns>
    private bool Sweep(double* c)
    {
        bool turned = false;
        for (int p = 0; p < _order - 1; p++)
        {
            for (int q = p + 1; q < _order; q++)
            {
                turned |= Rotate(c + (nint)p * StrideOf(_order), c + (nint)q * StrideOf(_order));
            }
        }

        return turned;
    }

    private bool Rotate(double* p, double* q)
    {
        T pp = ColumnKernel<T>.SquaredNorm(p, _order), qq = ColumnKernel<T>.SquaredNorm(q, _order);
        ColumnKernel<T>.Dot(p, q, _order, out T r, out T i);
        T square = T.MultiplyAdd(i, i, r * r);
        T turns = T.GreaterThan(square, pp * qq * T.Broadcast(OrthogonalityLimit(_order)));
        if (T.Bits(turns) == 0)
        {
            return false;
        }

        T zero = default, one = T.Broadcast(1), size = T.Sqrt(square);
        T zeta = (qq - pp) / (size + size);
        T steep = one / (T.Abs(zeta) + T.Sqrt(T.MultiplyAdd(zeta, zeta, one)));
        T tangent = T.Select(T.GreaterThan(zero, zeta), zero - steep, steep);
        T cosine = T.Select(turns, one / T.Sqrt(T.MultiplyAdd(tangent, tangent, one)), one);
        T sine = T.Select(turns, cosine * tangent, zero);
        T phaseR = T.Select(turns, r / size, one), phaseI = T.Select(turns, i / size, zero);
        Turn(p, q, cosine, sine, phaseR, phaseI);
        return true;
    }

    /// <summary>p, q ← c·p − s·q̃, s·p + c·q̃ with q̃ = q·e^{−jφ}, where e^{jφ} is the phase of pᴴq.</summary>
    private void Turn(double* p, double* q, T cosine, T sine, T phaseR, T phaseI)
    {
        T sr = sine * phaseR, si = sine * phaseI, cr = cosine * phaseR, ci = cosine * phaseI;
        for (nint at = 0; at < (nint)2 * _order * Entry; at += Entry)
        {
            T pr = T.Load(p + at), pi = T.Load(p + at + Imaginary), qr = T.Load(q + at), qi = T.Load(q + at + Imaginary);
            BlockKernel<T>.Store(
                p + at,
                T.MultiplySubtract(si, qi, T.MultiplySubtract(sr, qr, cosine * pr)),
                T.MultiplyAdd(si, qr, T.MultiplySubtract(sr, qi, cosine * pi)));
            BlockKernel<T>.Store(
                q + at,
                T.MultiplyAdd(ci, qi, T.MultiplyAdd(cr, qr, sine * pr)),
                T.MultiplySubtract(ci, qr, T.MultiplyAdd(cr, qi, sine * pi)));
        }
    }

    /// <summary>Norms of the columns of Rᴴ·J are the singular values of the scaled matrix.</summary>
    private void MeasureColumns(double* c, double* singularValues)
    {
        ReadOnlySpan<double> scale = _qr.Scale;
        Span<double> inverse = _inverseNorms.Span;
        for (int i = 0; i < _order * Tiling.Lanes; i += T.Count)
        {
            int direction = i / Tiling.Lanes, lane = i % Tiling.Lanes;
            T.Store(T.Sqrt(ColumnKernel<T>.SquaredNorm(c + (nint)direction * StrideOf(_order) + lane, _order)), singularValues + i);
        }

        for (int i = 0; i < _order * Tiling.Lanes; i++)
        {
            inverse[i] = singularValues[i] == 0 ? 0 : 1 / singularValues[i];
            singularValues[i] /= scale[i % Tiling.Lanes];
        }
    }
}
