using Boltup.Engine.Spectra;

namespace Boltup.Engine.Coupling;

/// <summary>All forces on a part of the coupled assembly: f − Bᵀλ.</summary>
internal static class PartLoads
{
    /// <summary>Writes them at the lines of a tile.</summary>
    /// <param name="columns">Columns of the part's FRFs.</param>
    /// <param name="forces">Forces of the operations, null for none.</param>
    /// <param name="lambda">The tile of the joint forces.</param>
    /// <param name="target">columns × cases entries.</param>
    public static void Fill(
        PartLayout part, int columns, TiledMatrix? forces, ReadOnlySpan<double> lambda, int tile, int cases, Span<double> target)
    {
        Span<double> total = target[..(columns * cases * Tiling.EntryLength)];
        total.Clear();
        forces?.Tile(tile).CopyTo(total);
        foreach (ConstraintEnd end in part.Ends)
        {
            for (int column = 0; column < cases; column++)
            {
                TileEntry.AddScaled(total, end.Interface * cases + column, lambda, end.Constraint * cases + column, -end.Sign);
            }
        }
    }
}
