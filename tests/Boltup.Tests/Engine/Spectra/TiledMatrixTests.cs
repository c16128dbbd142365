using System.Numerics;
using System.Runtime.CompilerServices;
using Boltup.Engine.Spectra;
using CsCheck;

namespace Boltup.Tests.Engine.Spectra;

public class TiledMatrixTests
{
    [Fact]
    public void ScatterSpectrum_AnySize_GathersTheSameValuesAndPadsWithTheLastLine() =>
        Gen.Select(Gen.Int[1, 40], Gen.Int[1, 5], Gen.Int[1, 5]).Sample((lines, rows, columns) =>
        {
            var matrix = new TiledMatrix(lines, rows, columns);
            Complex[] values = [.. Enumerable.Range(1, lines).Select(i => new Complex(i, -i))];
            matrix.ScatterSpectrum(rows - 1, columns - 1, values);
            Assert.Equal(values, matrix.GatherSpectrum(rows - 1, columns - 1));
            Span<double> lastEntry = matrix.Entry(matrix.TileCount - 1, rows - 1, columns - 1);
            Assert.Equal(lines, lastEntry[Tiling.Lanes - 1]);
            Assert.Equal(-lines, lastEntry[Tiling.EntryLength - 1]);
        });

    [Fact]
    public unsafe void Tile_OfAnyMatrix_StartsOnACacheLine()
    {
        for (int size = 1; size < 9; size++)
        {
            var matrix = new TiledMatrix(20, size, 3);
            Assert.Equal(0u, (nuint)Unsafe.AsPointer(ref matrix.Tile(1)[0]) % 64);
        }
    }
}
