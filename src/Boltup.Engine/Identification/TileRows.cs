using Boltup.Engine.Spectra;

namespace Boltup.Engine.Identification;

/// <summary>Takes some adjacent rows out of a matrix; rows of a tile are contiguous.</summary>
internal static class TileRows
{
    public static TiledMatrix Take(TiledMatrix matrix, int first, int count)
    {
        var rows = new TiledMatrix(matrix.Lines, count, matrix.Columns);
        int rowLength = matrix.Columns * Tiling.EntryLength;
        for (int tile = 0; tile < matrix.TileCount; tile++)
        {
            matrix.Tile(tile).Slice(first * rowLength, count * rowLength).CopyTo(rows.Tile(tile));
        }

        return rows;
    }
}
