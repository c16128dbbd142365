using System.Runtime.CompilerServices;

namespace Boltup.Engine.Spectra;

/// <summary>A block of doubles that starts on a 64-byte boundary, so that a vector of 8 lanes never crosses a cache line.</summary>
public sealed class TileBuffer
{
    private const int Alignment = 64;

    private readonly double[] _block;
    private readonly int _start;

    /// <summary>A buffer of zeros.</summary>
    public TileBuffer(int length)
    {
        _block = GC.AllocateArray<double>(length + Alignment / sizeof(double), pinned: true);
        _start = StartOf(_block);
        Length = length;
    }

    public int Length { get; }

    public Span<double> Span => _block.AsSpan(_start, Length);

    private static unsafe int StartOf(double[] pinned)
    {
        nuint address = (nuint)Unsafe.AsPointer(ref pinned[0]);
        return (int)((Alignment - address % Alignment) % Alignment / sizeof(double));
    }
}
