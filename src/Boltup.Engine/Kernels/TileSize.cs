using Boltup.Engine.Spectra;

namespace Boltup.Engine.Kernels;

/// <summary>Guards of the batch kernels: a wrong size is a bug of the caller, and must not become a write past a buffer.</summary>
internal static class TileSize
{
    /// <exception cref="ArgumentException">The span is too short for the entries.</exception>
    public static void Require(ReadOnlySpan<double> tile, int rows, int columns)
    {
        if (tile.Length < rows * columns * Tiling.EntryLength)
        {
            throw new ArgumentException($"a tile of {rows} × {columns} entries needs {rows * columns * Tiling.EntryLength} numbers, not {tile.Length}");
        }
    }

    /// <exception cref="ArgumentOutOfRangeException">More columns than rows, or more of either than there is room for.</exception>
    public static void RequireTall(int rows, int columns, int maxRows, int maxColumns)
    {
        ArgumentOutOfRangeException.ThrowIfGreaterThan(rows, maxRows);
        ArgumentOutOfRangeException.ThrowIfGreaterThan(columns, maxColumns);
        ArgumentOutOfRangeException.ThrowIfGreaterThan(columns, rows);
    }
}
