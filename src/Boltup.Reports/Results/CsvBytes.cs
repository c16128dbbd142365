using System.Buffers.Text;
using System.Text;

namespace Boltup.Reports.Results;

/// <summary>Builds CSV in a reused byte buffer; numbers in the shortest form that reads back to the same double.</summary>
internal sealed class CsvBytes(Stream output)
{
    private const int FlushAt = 1 << 16;
    private const int LongestNumber = 32;

    private readonly byte[] _buffer = new byte[FlushAt + 4096];
    private int _length;

    public CsvBytes Text(ReadOnlySpan<byte> text)
    {
        if (text.Length > _buffer.Length - _length)
        {
            Flush();
        }

        if (text.Length > _buffer.Length)
        {
            output.Write(text);
            return this;
        }

        text.CopyTo(_buffer.AsSpan(_length));
        _length += text.Length;
        return this;
    }

    public CsvBytes Number(double value)
    {
        if (_buffer.Length - _length < LongestNumber)
        {
            Flush();
        }

        Utf8Formatter.TryFormat(value, _buffer.AsSpan(_length), out int written);
        _length += written;
        return this;
    }

    /// <summary>A number as text.</summary>
    public static byte[] Format(double value)
    {
        Span<byte> text = stackalloc byte[LongestNumber];
        Utf8Formatter.TryFormat(value, text, out int written);
        return text[..written].ToArray();
    }

    public CsvBytes Comma() => Text(","u8);

    public void EndRow()
    {
        Text("\n"u8);
        if (_length > FlushAt)
        {
            Flush();
        }
    }

    public void Flush()
    {
        output.Write(_buffer, 0, _length);
        _length = 0;
    }

    /// <summary>A name as a field: quoted where it holds a comma, a quote or a line end (RFC 4180).</summary>
    public static byte[] Field(string name) => Encoding.UTF8.GetBytes(
        name.AsSpan().ContainsAny(",\"\n\r") ? $"\"{name.Replace("\"", "\"\"", StringComparison.Ordinal)}\"" : name);
}
