using System.Buffers.Text;
using System.Globalization;

namespace Boltup.Files.Text;

/// <summary>
/// Reads decimal numbers from bytes, bit-identical with the library: where the digits fit into 53 bits and the power of ten is exact
/// (10⁰…10²²), one correctly rounded operation gives the nearest double (Clinger, PLDI 1990); everything else goes to the library.
/// </summary>
internal static class NumberParser
{
    private const int ExactPower = 22;
    private const ulong ExactMantissa = 1UL << 53;

    private static readonly double[] PowersOfTen =
    [
        1e0, 1e1, 1e2, 1e3, 1e4, 1e5, 1e6, 1e7, 1e8, 1e9, 1e10, 1e11, 1e12, 1e13, 1e14, 1e15, 1e16, 1e17, 1e18, 1e19, 1e20, 1e21, 1e22,
    ];

    /// <summary>Reads a number with blanks around it; exponents may be written E, e, D or d, or with a bare sign (<c>1.5-101</c>).</summary>
    public static bool TryParse(ReadOnlySpan<byte> text, out double value)
    {
        text = text.Trim((byte)' ');
        int i = 0;
        bool negative = i < text.Length && text[i] == '-';
        i += negative || (i < text.Length && text[i] == '+') ? 1 : 0;
        ulong mantissa = 0;
        int digits = 0;
        int scale = 0;
        ReadDigits(text, ref i, ref mantissa, ref digits);
        int whole = digits;
        if (i < text.Length && text[i] == '.')
        {
            i++;
            ReadDigits(text, ref i, ref mantissa, ref digits);
            scale = whole - digits;
        }

        if (digits is 0 or > 19 || mantissa >= ExactMantissa || !TryReadExponent(text, ref i, out int exponent))
        {
            return TryParseByLibrary(text, out value);
        }

        int power = exponent + scale;
        if (i != text.Length || power is < -ExactPower or > ExactPower)
        {
            return TryParseByLibrary(text, out value);
        }

        double magnitude = power < 0 ? mantissa / PowersOfTen[-power] : mantissa * PowersOfTen[power];
        value = negative ? -magnitude : magnitude;
        return true;
    }

    private static void ReadDigits(ReadOnlySpan<byte> text, ref int i, ref ulong mantissa, ref int digits)
    {
        while (i < text.Length)
        {
            uint digit = (uint)(text[i] - '0');
            if (digit > 9)
            {
                return;
            }

            mantissa = 10 * mantissa + digit;
            digits++;
            i++;
        }
    }

    private static bool TryReadExponent(ReadOnlySpan<byte> text, ref int i, out int exponent)
    {
        exponent = 0;
        if (i == text.Length)
        {
            return true;
        }

        bool hasLetter = text[i] is (byte)'E' or (byte)'e' or (byte)'D' or (byte)'d';
        i += hasLetter ? 1 : 0;
        bool negative = i < text.Length && text[i] == '-';
        bool hasSign = negative || (i < text.Length && text[i] == '+');
        i += hasSign ? 1 : 0;
        int first = i;
        while (i < text.Length && (uint)(text[i] - '0') <= 9 && i - first < 4)
        {
            exponent = 10 * exponent + (text[i++] - '0');
        }

        exponent = negative ? -exponent : exponent;
        return i > first && (hasLetter || hasSign);
    }

    /// <summary>The library reads what is left, once Fortran's exponents are written as it expects them.</summary>
    private static bool TryParseByLibrary(ReadOnlySpan<byte> text, out double value)
    {
        if (Utf8Parser.TryParse(text, out value, out int used) && used == text.Length)
        {
            return true;
        }

        Span<char> rewritten = stackalloc char[72];
        int length = 0;
        for (int i = 0; i < text.Length && length < rewritten.Length - 2; i++)
        {
            bool bareSign = text[i] is (byte)'+' or (byte)'-' && i > 0 && (char.IsAsciiDigit((char)text[i - 1]) || text[i - 1] == '.');
            if (bareSign)
            {
                rewritten[length++] = 'E';
            }

            rewritten[length++] = text[i] is (byte)'D' or (byte)'d' ? 'E' : (char)text[i];
        }

        return double.TryParse(rewritten[..length], NumberStyles.Float, CultureInfo.InvariantCulture, out value)
            || TryParseName(rewritten[..length], out value);
    }

    private static bool TryParseName(ReadOnlySpan<char> text, out double value)
    {
        bool negative = text.StartsWith("-");
        ReadOnlySpan<char> name = text.TrimStart("+-");
        value = name switch
        {
            _ when name.Equals("nan", StringComparison.OrdinalIgnoreCase) => double.NaN,
            _ when name.Equals("inf", StringComparison.OrdinalIgnoreCase) => double.PositiveInfinity,
            _ when name.Equals("infinity", StringComparison.OrdinalIgnoreCase) => double.PositiveInfinity,
            _ => 0,
        };
        value = negative ? -value : value;
        return value != 0;
    }
}
