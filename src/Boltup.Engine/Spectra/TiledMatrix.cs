using System.Numerics;

namespace Boltup.Engine.Spectra;

/// <summary>
/// One complex matrix of equal size at every frequency line, stored as <see cref="Tiling"/> says. A vector over all lines
/// (forces, responses, λ) is a matrix of one column.
/// </summary>
public sealed class TiledMatrix
{
    private readonly TileBuffer _buffer;

    /// <summary>A matrix of zeros.</summary>
    public TiledMatrix(int lines, int rows, int columns)
    {
        Lines = lines;
        Rows = rows;
        Columns = columns;
        TileLength = rows * columns * Tiling.EntryLength;
        _buffer = new TileBuffer(checked(TileLength * Tiling.TilesFor(lines)));
    }

    public int Lines { get; }

    public int Rows { get; }

    public int Columns { get; }

    public int TileCount => Tiling.TilesFor(Lines);

    /// <summary>Numbers in one tile: rows × columns × <see cref="Tiling.EntryLength"/>.</summary>
    public int TileLength { get; }

    public Complex this[int line, int row, int column]
    {
        get
        {
            ReadOnlySpan<double> entry = Entry(line / Tiling.Lanes, row, column);
            int lane = line % Tiling.Lanes;
            return new Complex(entry[lane], entry[Tiling.Lanes + lane]);
        }
    }

    /// <summary>The matrix at 8 adjacent lines: row → column → 8 real, 8 imaginary.</summary>
    public Span<double> Tile(int tile) => _buffer.Span.Slice(tile * TileLength, TileLength);

    /// <summary>One entry at 8 adjacent lines: 8 real parts, then 8 imaginary parts.</summary>
    public Span<double> Entry(int tile, int row, int column) =>
        _buffer.Span.Slice(tile * TileLength + (row * Columns + column) * Tiling.EntryLength, Tiling.EntryLength);

    /// <summary>Copies one entry over all lines out of the tiles.</summary>
    public Complex[] GatherSpectrum(int row, int column)
    {
        var spectrum = new Complex[Lines];
        for (int line = 0; line < Lines; line++)
        {
            spectrum[line] = this[line, row, column];
        }

        return spectrum;
    }

    /// <summary>Copies one entry over all lines into the tiles and pads the last one.</summary>
    /// <param name="values">One value per line.</param>
    public void ScatterSpectrum(int row, int column, ReadOnlySpan<Complex> values)
    {
        if (values.Length != Lines)
        {
            throw new ArgumentException($"a spectrum of {values.Length} values does not fit {Lines} lines", nameof(values));
        }

        for (int tile = 0; tile < TileCount; tile++)
        {
            Span<double> entry = Entry(tile, row, column);
            for (int lane = 0; lane < Tiling.Lanes; lane++)
            {
                Complex value = values[Math.Min(tile * Tiling.Lanes + lane, Lines - 1)];
                entry[lane] = value.Real;
                entry[Tiling.Lanes + lane] = value.Imaginary;
            }
        }
    }
}
