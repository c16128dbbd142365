namespace Boltup.Files.Text;

/// <summary>
/// Reads decimal numbers from bytes, bit-identical with the library: where the digits fit into 53 bits and the power of ten is exact
/// (10⁰…10²²), one correctly rounded operation gives the nearest double (Clinger, PLDI 1990); everything else goes to the library.
/// </summary>
internal static class NumberParser
{
    private const int ExactPower = 22;
    private const ulong ExactMantissa = 1UL << 53;

    /// <summary>More digits than this may overflow 64 bits before the limit of the mantissa is looked at.</summary>
    private const int MostDigits = 19;

    private static readonly double[] PowersOfTen =
    [
        1e0, 1e1, 1e2, 1e3, 1e4, 1e5, 1e6, 1e7, 1e8, 1e9, 1e10, 1e11, 1e12, 1e13, 1e14, 1e15, 1e16, 1e17, 1e18, 1e19, 1e20, 1e21, 1e22,
    ];

    /// <summary>Reads a number with blanks around it.</summary>
    public static bool TryParse(ReadOnlySpan<byte> text, out double value)
    {
        NumberForms forms = NumberForms.Plain;
        return TryParse(Blanks.Trim(text), out value, ref forms);
    }

    /// <summary>
    /// Reads a number that may have blanks before it, not behind; exponents may be written E, e, D or d, or with a bare sign
    /// (<c>1.5-101</c>).
    /// </summary>
    /// <param name="forms">Gathers the forms that were met.</param>
    public static bool TryParse(ReadOnlySpan<byte> text, out double value, ref NumberForms forms)
    {
        int i = 0;
        while (i < text.Length && text[i] == ' ')
        {
            i++;
        }

        int begin = i;
        bool negative = i < text.Length && text[i] == '-';
        i += negative || (i < text.Length && text[i] == '+') ? 1 : 0;
        ulong mantissa = 0;
        int first = i;
        ReadDigits(text, ref i, ref mantissa);
        int digits = i - first;
        int scale = 0;
        if (i < text.Length && text[i] == '.')
        {
            int point = ++i;
            ReadDigits(text, ref i, ref mantissa);
            scale = point - i;
            digits -= scale;
        }

        if (digits is 0 or > MostDigits || mantissa >= ExactMantissa || !TryAddExponent(text[i..], ref scale) || scale is < -ExactPower or > ExactPower)
        {
            return RareNumber.TryParse(text[begin..], out value, ref forms);
        }

        double magnitude = scale < 0 ? mantissa / PowersOfTen[-scale] : mantissa * PowersOfTen[scale];
        value = negative ? -magnitude : magnitude;
        return true;
    }

    private static void ReadDigits(ReadOnlySpan<byte> text, ref int i, ref ulong mantissa)
    {
        for (; i < text.Length && (uint)(text[i] - '0') <= 9; i++)
        {
            mantissa = 10 * mantissa + (uint)(text[i] - '0');
        }
    }

    /// <summary>Takes nothing, or a letter E, a sign and one to three digits.</summary>
    private static bool TryAddExponent(ReadOnlySpan<byte> text, ref int scale)
    {
        if (text.IsEmpty)
        {
            return true;
        }

        if (text.Length is < 2 or > 5 || (text[0] | 0x20) != 'e')
        {
            return false;
        }

        bool negative = text[1] == '-';
        int i = negative || text[1] == '+' ? 2 : 1;
        int exponent = 0;
        int first = i;
        for (; i < text.Length && (uint)(text[i] - '0') <= 9; i++)
        {
            exponent = 10 * exponent + (text[i] - '0');
        }

        scale += negative ? -exponent : exponent;
        return i == text.Length && i > first;
    }
}
