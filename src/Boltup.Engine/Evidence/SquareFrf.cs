using Boltup.Engine.Coupling;
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
            LaneLines.Collect(SingularLanes(lu, matrix.Tile(tile)), axis, tile, singularHz);
        }

        if (singularHz.Count == 0)
        {
            return solution;
        }

        Refuse(what, singularHz, diagnostics);
        return null;
    }

    private static byte SingularLanes(BatchLu lu, ReadOnlySpan<double> matrix)
    {
        Span<double> condition = stackalloc double[Tiling.Lanes];
        lu.EstimateCondition(matrix, condition);
        byte singular = 0;
        for (int lane = 0; lane < Tiling.Lanes; lane++)
        {
            singular |= (byte)(condition[lane] < ConditionCheck.Singular ? 0 : 1 << lane);
        }

        return singular;
    }

    /// <summary>Says at which lines FRFs are singular.</summary>
    public static void Refuse(string what, List<double> singularHz, DiagnosticBag diagnostics) => diagnostics.Error(
        EngineCodes.SingularFrf,
        $"the interface FRFs of {what} are singular at {FrequencyList.Of(singularHz)}",
        help: "two dofs that move as one, or an FRF that is zero: leave a dof out, or repair the data");
}
