using Boltup.Engine.Diagnostics;
using Boltup.Engine.Evidence;
using Boltup.Engine.Kernels;
using Boltup.Engine.Parts;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Identification;

/// <summary>
/// Identifies blocked forces in situ: f̄ = Y⁺u at the indicators of an installed source (Moorhouse, Elliott, Evans, JSV 325 (2009);
/// ISO 20270), and predicts with them what the validation sensors should have measured.
/// </summary>
public static class Identifier
{
    /// <returns>The result, or null after an error in <paramref name="diagnostics"/>.</returns>
    public static IdentificationResult? Run(BenchModel bench, DiagnosticBag diagnostics)
    {
        if (bench.Installed.Evaluate(bench.Axis, bench.Sensors, bench.Interface, diagnostics) is not { } frf)
        {
            return null;
        }

        BenchQuality quality = BenchQuality.Judge(bench, frf, diagnostics);
        TiledMatrix indicators = TileRows.Take(frf.Values, 0, bench.Indicators.Count);
        TiledMatrix validation = TileRows.Take(frf.Values, bench.Indicators.Count, bench.Validation.Count);
        TiledMatrix[] columns = [.. bench.Operations.Select(operation => MeasuredColumns(bench, operation))];
        TiledMatrix? noise = bench.Coherence is { } coherence && bench.Solve.UsesNoise
            ? TileRows.Take(FrfRandomError.StandardDeviation(frf.Values, coherence.Values, coherence.Averages), 0, bench.Indicators.Count)
            : null;
        var solver = new ForceSolver(indicators, columns, bench.Solve, noise);
        solver.Run();
        var singularValues = new SingularSpectrum(bench.Axis, solver.SingularValues);
        RankCheck.Run(bench, singularValues, diagnostics);
        if (diagnostics.HasErrors)
        {
            return null;
        }

        IdentifiedOperation[] operations =
            [.. bench.Operations.Select((operation, i) => Describe(bench, operation, solver.Forces[i], solver.Lines[i], validation))];
        return new IdentificationResult(
            bench.Title,
            bench.Axis,
            bench.Interface,
            bench.Indicators,
            bench.Validation,
            bench.Solve,
            operations,
            singularValues,
            bench.Coherence?.Report,
            quality,
            KernelChoice.Name,
            [.. diagnostics.Items]);
    }

    /// <summary>Indicators × columns of an operation, and its single runs after them: they share the factorisation.</summary>
    private static TiledMatrix MeasuredColumns(BenchModel bench, BenchOperation operation)
    {
        SpectrumSet[] sets = [.. operation.Columns, .. operation.Runs ?? []];
        var tiles = new TiledMatrix(bench.Axis.Count, bench.Indicators.Count, sets.Length);
        for (int i = 0; i < sets.Length * bench.Indicators.Count; i++)
        {
            (int column, int row) = Math.DivRem(i, bench.Indicators.Count);
            tiles.ScatterSpectrum(row, column, sets[column].Values[row]);
        }

        return tiles;
    }

    private static IdentifiedOperation Describe(
        BenchModel bench, BenchOperation operation, TiledMatrix forces, LineChoice[] lines, TiledMatrix validation)
    {
        int columns = operation.Columns.Count;
        SpectrumSet[] solved = [.. Enumerable.Range(0, forces.Columns).Select(column => ColumnOf(bench.Axis, bench.Interface, forces, column))];
        TiledMatrix predicted = Product(validation, forces);
        return new IdentifiedOperation(
            operation.Name,
            operation.Amplitude,
            operation.Phase,
            operation.IsDensity,
            solved[..columns],
            lines,
            [.. Enumerable.Range(0, columns).Select(column => ColumnOf(bench.Axis, bench.Validation, predicted, column))],
            [.. operation.Columns.Select(set => new SpectrumSet(bench.Axis, bench.Validation, [.. set.Values.Skip(bench.Indicators.Count)]))],
            solved.Length > columns ? RunScatter.Of(solved[columns..]) : null);
    }

    private static SpectrumSet ColumnOf(FrequencyAxis axis, IReadOnlyList<Dof> dofs, TiledMatrix tiles, int column) =>
        new(axis, dofs, [.. Enumerable.Range(0, dofs.Count).Select(row => tiles.GatherSpectrum(row, column))]);

    private static TiledMatrix Product(TiledMatrix a, TiledMatrix b)
    {
        var product = new TiledMatrix(a.Lines, a.Rows, b.Columns);
        for (int tile = 0; tile < a.TileCount && a.Rows > 0; tile++)
        {
            BatchProduct.Multiply(a.Tile(tile), b.Tile(tile), product.Tile(tile), a.Rows, a.Columns, b.Columns);
        }

        return product;
    }
}
