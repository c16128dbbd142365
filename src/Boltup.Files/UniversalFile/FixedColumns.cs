using System.Globalization;
using System.Text;
using System.Text.Unicode;
using Boltup.Files.Text;

namespace Boltup.Files.UniversalFile;

/// <summary>Fields of a line by their columns, as Fortran formats lay them out; a line that ends early has blank fields.</summary>
internal static class FixedColumns
{
    private const int WidestField = 32;

    public static string Text(string line, int start, int length) => Field(line, start, length).ToString();

    /// <summary>An integer field; blank is 0.</summary>
    public static bool TryInteger(string line, int start, int length, out int value)
    {
        ReadOnlySpan<char> text = Field(line, start, length);
        value = 0;
        return text.Length == 0 || int.TryParse(text, NumberStyles.AllowLeadingSign, CultureInfo.InvariantCulture, out value);
    }

    /// <summary>A real field; blank is 0.</summary>
    public static bool TryReal(string line, int start, int length, out double value)
    {
        ReadOnlySpan<char> text = Field(line, start, length);
        Span<byte> bytes = stackalloc byte[WidestField];
        value = 0;
        return text.Length == 0 || NumberParser.TryParse(bytes[..Encoding.ASCII.GetBytes(text, bytes)], out value);
    }

    /// <summary>Header text: UTF-8 where it is valid, otherwise Latin-1.</summary>
    public static string Decode(ReadOnlySpan<byte> line, Liberties liberties)
    {
        if (Ascii.IsValid(line))
        {
            return Encoding.ASCII.GetString(line);
        }

        bool isUtf8 = Utf8.IsValid(line);
        liberties.Take(isUtf8 ? Liberty.Utf8Header : Liberty.Latin1Header);
        return (isUtf8 ? Encoding.UTF8 : Encoding.Latin1).GetString(line);
    }

    private static ReadOnlySpan<char> Field(string line, int start, int length) =>
        start >= line.Length ? [] : line.AsSpan(start, Math.Min(length, line.Length - start)).Trim();
}
