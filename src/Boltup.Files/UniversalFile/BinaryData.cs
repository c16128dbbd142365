using System.Buffers.Binary;
using System.Runtime.InteropServices;
using Boltup.Files.Text;

namespace Boltup.Files.UniversalFile;

/// <summary>Reads the values of a 58b record through a reused buffer.</summary>
internal sealed class BinaryData(ByteSource source)
{
    private byte[] _buffer = [];

    /// <summary>Reads as many numbers as there is room for.</summary>
    /// <returns>False when the file has become shorter than it was.</returns>
    public bool Read(DataLayout layout, Span<double> numbers)
    {
        int points = numbers.Length / layout.NumbersPerPoint;
        int bytes = points * layout.BytesPerPoint;
        if (_buffer.Length < bytes)
        {
            _buffer = new byte[bytes];
        }

        Span<byte> data = _buffer.AsSpan(0, bytes);
        if (source.ReadAt(layout.Offset, data) < bytes)
        {
            return false;
        }

        bool isNative = layout is { IsDouble: true, HasSingleAbscissa: false } && layout.IsBigEndian != BitConverter.IsLittleEndian;
        if (isNative)
        {
            MemoryMarshal.Cast<byte, double>(data).CopyTo(numbers);
        }
        else
        {
            Convert(layout, data, numbers);
        }

        return true;
    }

    private static void Convert(DataLayout layout, ReadOnlySpan<byte> data, Span<double> numbers)
    {
        int perPoint = layout.NumbersPerPoint;
        for (int i = 0; i < numbers.Length; i++)
        {
            bool isAbscissa = layout.HasAbscissa && i % perPoint == 0;
            int size = isAbscissa ? layout.AbscissaBytes : layout.ValueBytes;
            numbers[i] = ReadOne(data, size, layout.IsBigEndian);
            data = data[size..];
        }
    }

    private static double ReadOne(ReadOnlySpan<byte> data, int size, bool bigEndian) => (size, bigEndian) switch
    {
        (4, false) => BinaryPrimitives.ReadSingleLittleEndian(data),
        (4, true) => BinaryPrimitives.ReadSingleBigEndian(data),
        (_, false) => BinaryPrimitives.ReadDoubleLittleEndian(data),
        _ => BinaryPrimitives.ReadDoubleBigEndian(data),
    };
}
