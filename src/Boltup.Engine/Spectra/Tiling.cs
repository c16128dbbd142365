namespace Boltup.Engine.Spectra;

/// <summary>
/// The storage order of every spectrum and FRF matrix in the engine, stated here and nowhere else:
/// tile → row → column → 8 real parts, then 8 imaginary parts. A tile holds 8 adjacent frequency lines, one per SIMD lane;
/// the last tile is padded with copies of the last line.
/// </summary>
public static class Tiling
{
    /// <summary>Frequency lines in a tile.</summary>
    public const int Lanes = 8;

    /// <summary>Numbers per entry of a tile: 8 real parts, then 8 imaginary parts.</summary>
    public const int EntryLength = 2 * Lanes;

    public static int TilesFor(int lines) => (lines + Lanes - 1) / Lanes;
}
