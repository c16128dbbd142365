using System.Buffers;
using System.Globalization;
using System.Text;

namespace Boltup.Files.Text;

/// <summary>Reads what the quick path of <see cref="NumberParser"/> leaves: long numbers, exponents of old, NaN and infinities.</summary>
internal static class RareNumber
{
    private const int LongestOldNumber = 64;

    private static readonly SearchValues<byte> PlainBytes = SearchValues.Create("0123456789+-.eE"u8);

    private static readonly SearchValues<byte> OldBytes = SearchValues.Create("0123456789+-.dD"u8);

    private const NumberStyles Plain = NumberStyles.AllowLeadingSign | NumberStyles.AllowDecimalPoint | NumberStyles.AllowExponent;

    public static bool TryParse(ReadOnlySpan<byte> text, out double value, ref NumberForms forms) =>
        (IsPlain(text) && double.TryParse(text, Plain, CultureInfo.InvariantCulture, out value))
        || TryNotFinite(text, out value, ref forms)
        || TryOldExponent(text, out value, ref forms);

    /// <summary>Keeps names of infinities and other things that the library takes as well away from it.</summary>
    private static bool IsPlain(ReadOnlySpan<byte> text) => text.IndexOfAnyExcept(PlainBytes) < 0;

    private static bool TryNotFinite(ReadOnlySpan<byte> text, out double value, ref NumberForms forms)
    {
        bool isNegative = text.StartsWith("-"u8);
        ReadOnlySpan<byte> name = text.TrimStart("+-"u8);
        bool isInfinite = Ascii.EqualsIgnoreCase(name, "inf"u8) || Ascii.EqualsIgnoreCase(name, "infinity"u8) || name.StartsWith("1.#INF"u8);
        bool isNan = Ascii.EqualsIgnoreCase(name, "nan"u8) || name.StartsWith("1.#IND"u8) || name.StartsWith("1.#QNAN"u8);
        value = isInfinite ? (isNegative ? double.NegativeInfinity : double.PositiveInfinity) : double.NaN;
        forms |= isInfinite || isNan ? NumberForms.NotFinite : NumberForms.Plain;
        return isInfinite || isNan;
    }

    private static bool TryOldExponent(ReadOnlySpan<byte> text, out double value, ref NumberForms forms)
    {
        value = 0;
        int letter = text.IndexOfAny((byte)'D', (byte)'d');
        int cut = letter >= 0 ? letter : text.LastIndexOfAny((byte)'+', (byte)'-');
        if (cut <= 0 || text.Length >= LongestOldNumber || text.IndexOfAnyExcept(OldBytes) >= 0)
        {
            return false;
        }

        Span<byte> rewritten = stackalloc byte[LongestOldNumber + 1];
        ReadOnlySpan<byte> exponent = text[(letter >= 0 ? cut + 1 : cut)..];
        text[..cut].CopyTo(rewritten);
        rewritten[cut] = (byte)'E';
        exponent.CopyTo(rewritten[(cut + 1)..]);
        forms |= letter >= 0 ? NumberForms.LetterD : NumberForms.NoLetter;
        return double.TryParse(rewritten[..(cut + 1 + exponent.Length)], Plain, CultureInfo.InvariantCulture, out value);
    }
}
