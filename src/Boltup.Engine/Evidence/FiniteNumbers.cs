using Boltup.Engine.Diagnostics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Evidence;

/// <summary>Looks for NaN and infinity, which would spread over every result at their line.</summary>
public static class FiniteNumbers
{
    private const int PlacesShown = 5;

    /// <summary>Checks FRFs.</summary>
    /// <param name="owner">What the values belong to, as messages begin.</param>
    /// <returns>False after an error in <paramref name="diagnostics"/>.</returns>
    public static bool Check(string owner, SourceSpan? origin, FrfMatrix frf, DiagnosticBag diagnostics) => Check(
        owner,
        origin,
        frf.Axis,
        frf.Values,
        (row, column) => new DofPair(frf.Rows[row], frf.Columns[column]).ToString(),
        diagnostics);

    /// <summary>Checks spectra.</summary>
    /// <param name="owner">What the values belong to, as messages begin.</param>
    /// <returns>False after an error in <paramref name="diagnostics"/>.</returns>
    public static bool Check(string owner, SourceSpan? origin, SpectrumSet spectra, DiagnosticBag diagnostics) =>
        Check(owner, origin, spectra.Axis, spectra.ToTiles(), (row, _) => spectra.Dofs[row].ToString(), diagnostics);

    private static bool Check(
        string owner, SourceSpan? origin, FrequencyAxis axis, TiledMatrix values, Func<int, int, string> nameOf, DiagnosticBag diagnostics)
    {
        var spoiledLines = new SortedSet<int>();
        var places = new List<string>();
        for (int i = 0; i < values.Rows * values.Columns; i++)
        {
            (int row, int column) = (i / values.Columns, i % values.Columns);
            if (CollectSpoiled(values, row, column, spoiledLines))
            {
                places.Add($"`{nameOf(row, column)}`");
            }
        }

        if (places.Count > 0)
        {
            diagnostics.Error(
                EngineCodes.NotFinite,
                FormattableString.Invariant($"{owner}: values at {spoiledLines.Count} of {axis.Count} lines are no finite numbers"),
                origin,
                "repair the data or leave the lines out",
                $"at {FrequencyList.Of([.. spoiledLines.Select(line => axis[line])])}",
                $"in {string.Join(", ", places.Take(PlacesShown))}{(places.Count > PlacesShown ? FormattableString.Invariant($" and {places.Count - PlacesShown} more") : "")}");
        }

        return places.Count == 0;
    }

    private static bool CollectSpoiled(TiledMatrix values, int row, int column, SortedSet<int> lines)
    {
        bool any = false;
        for (int tile = 0; tile < values.TileCount; tile++)
        {
            ReadOnlySpan<double> entry = values.Entry(tile, row, column);
            for (int lane = 0; lane < Tiling.Lanes; lane++)
            {
                if (!double.IsFinite(entry[lane]) || !double.IsFinite(entry[Tiling.Lanes + lane]))
                {
                    any = true;
                    lines.Add(Math.Min(tile * Tiling.Lanes + lane, values.Lines - 1));
                }
            }
        }

        return any;
    }
}
