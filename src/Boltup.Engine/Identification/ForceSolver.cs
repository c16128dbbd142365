using Boltup.Engine.Kernels;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Identification;

/// <summary>
/// Solves u = Y·f̄ for the blocked forces at every line: over-determined in-situ inversion (Moorhouse, Elliott, Evans, JSV 325 (2009);
/// ISO 20270). All operations of a bench share the factorisation of a line.
/// </summary>
/// <remarks>Lines are shared out to threads tile by tile; results do not depend on their number.</remarks>
internal sealed class ForceSolver
{
    private readonly TiledMatrix _frf;
    private readonly TiledMatrix? _noise;
    private readonly SolveChoice _choice;
    private readonly TiledMatrix[] _measured;
    private readonly TiledMatrix[] _forces;
    private readonly LineChoice[][] _lines;
    private readonly double[][] _singularValues;

    /// <param name="frf">Indicators × interface dofs.</param>
    /// <param name="measured">For each operation indicators × its columns.</param>
    /// <param name="noise">Standard deviations of the FRFs where the choice needs them.</param>
    public ForceSolver(TiledMatrix frf, IReadOnlyList<TiledMatrix> measured, SolveChoice choice, TiledMatrix? noise)
    {
        (_frf, _choice, _noise) = (frf, choice, noise);
        _measured = [.. measured];
        _forces = [.. measured.Select(columns => new TiledMatrix(frf.Lines, frf.Columns, columns.Columns))];
        _lines = [.. measured.Select(_ => new LineChoice[frf.Lines])];
        _singularValues = [.. Enumerable.Range(0, frf.Columns).Select(_ => new double[frf.Lines])];
    }

    /// <summary>For each operation interface dofs × its columns.</summary>
    public IReadOnlyList<TiledMatrix> Forces => _forces;

    /// <summary>For each operation what was done at each line.</summary>
    public IReadOnlyList<LineChoice[]> Lines => _lines;

    /// <summary>Largest first; for each one value per line.</summary>
    public IReadOnlyList<double[]> SingularValues => _singularValues;

    public void Run() => Parallel.For(0, Math.Min(Environment.ProcessorCount, _frf.TileCount), Work);

    private void Work(int worker)
    {
        int workers = Math.Min(Environment.ProcessorCount, _frf.TileCount);
        var svd = new BatchSvd(_frf.Rows, _frf.Columns);
        var qr = new BatchQr(_frf.Rows, _frf.Columns);
        var filter = new SingularFilter(_frf.Rows, _frf.Columns, _choice);
        var coefficients = new TileBuffer(_frf.Columns * Math.Max(1, _measured.Select(matrix => matrix.Columns).DefaultIfEmpty().Max()) * Tiling.EntryLength);
        for (int tile = worker; tile < _frf.TileCount; tile += workers)
        {
            svd.Factor(_frf.Tile(tile), _frf.Rows, _frf.Columns);
            KeepSingularValues(svd.SingularValues, tile);
            if (_choice.Method == SolveMethod.LeastSquares)
            {
                SolvePlainly(qr, tile);
            }
            else
            {
                SolveFiltered(svd, filter, coefficients.Span, tile);
            }
        }
    }

    private void SolvePlainly(BatchQr qr, int tile)
    {
        qr.Factor(_frf.Tile(tile), _frf.Rows, _frf.Columns);
        for (int i = 0; i < _measured.Length; i++)
        {
            qr.Solve(_measured[i].Tile(tile), _measured[i].Columns, _forces[i].Tile(tile));
            Array.Fill(_lines[i], new LineChoice(_frf.Columns, 0), tile * Tiling.Lanes, LanesOf(tile));
        }
    }

    private void SolveFiltered(BatchSvd svd, SingularFilter filter, Span<double> coefficients, int tile)
    {
        for (int i = 0; i < _measured.Length; i++)
        {
            int count = _measured[i].Columns;
            svd.Project(_measured[i].Tile(tile), count, coefficients);
            ReadOnlySpan<double> noise = _noise is null ? default : _noise.Tile(tile);
            filter.Choose(svd.SingularValues, coefficients, _measured[i].Tile(tile), count, noise);
            svd.Combine(filter.Gains, coefficients, count, _forces[i].Tile(tile));
            filter.Choices[..LanesOf(tile)].CopyTo(_lines[i].AsSpan(tile * Tiling.Lanes));
        }
    }

    private int LanesOf(int tile) => Math.Min(Tiling.Lanes, _frf.Lines - tile * Tiling.Lanes);

    private void KeepSingularValues(ReadOnlySpan<double> values, int tile)
    {
        Span<double> sorted = stackalloc double[_frf.Columns];
        for (int lane = 0; lane < LanesOf(tile); lane++)
        {
            for (int i = 0; i < sorted.Length; i++)
            {
                sorted[i] = -values[i * Tiling.Lanes + lane];
            }

            sorted.Sort();
            for (int i = 0; i < sorted.Length; i++)
            {
                _singularValues[i][tile * Tiling.Lanes + lane] = -sorted[i];
            }
        }
    }
}
