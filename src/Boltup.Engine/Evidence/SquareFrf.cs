using Boltup.Engine.Diagnostics;
using Boltup.Engine.Kernels;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Evidence;

/// <summary>Square FRFs of an interface: solving with them tile by tile, and the agreement of dofs that it needs.</summary>
internal static class SquareFrf
{
    /// <exception cref="ArgumentException">The rows are not these dofs in this order.</exception>
    public static void RequireInterface(FrfMatrix frf, IReadOnlyList<Dof> dofs)
    {
        if (!frf.Rows.SequenceEqual(dofs))
        {
            throw new ArgumentException($"the FRFs respond at {string.Join(", ", frf.Rows)}, not at {string.Join(", ", dofs)}");
        }
    }

    /// <exception cref="ArgumentException">The axes differ.</exception>
    public static void RequireLines(FrequencyAxis first, FrequencyAxis second)
    {
        if (!first.Matches(second))
        {
            throw new ArgumentException($"the lines differ: {first}, and {second}");
        }
    }

    /// <summary>A⁻¹B at every line.</summary>
    /// <param name="what">What the matrix describes, for the message.</param>
    /// <returns>The solution, or null after an error in <paramref name="diagnostics"/>: A is singular at a line.</returns>
    public static TiledMatrix? Solve(FrequencyAxis axis, TiledMatrix matrix, TiledMatrix rightSides, string what, DiagnosticBag diagnostics)
    {
        var solution = new TiledMatrix(matrix.Lines, matrix.Columns, rightSides.Columns);
        var lu = new BatchLu(matrix.Rows);
        List<double> singularHz = [];
        for (int tile = 0; tile < matrix.TileCount; tile++)
        {
            lu.Factor(matrix.Tile(tile), matrix.Rows);
            rightSides.Tile(tile).CopyTo(solution.Tile(tile));
            lu.Solve(solution.Tile(tile), rightSides.Columns);
            LaneLines.Collect(lu.SingularLanes, axis, tile, singularHz);
        }

        return singularHz.Count == 0 ? solution : Refuse(what, singularHz, diagnostics);
    }

    private static TiledMatrix? Refuse(string what, List<double> singularHz, DiagnosticBag diagnostics)
    {
        diagnostics.Error(
            EngineCodes.SingularFrf,
            $"the interface FRFs of {what} are singular at {FrequencyList.Of(singularHz)}",
            help: "two dofs that move as one, or an FRF that is zero: leave a dof out, or repair the data");
        return null;
    }
}
