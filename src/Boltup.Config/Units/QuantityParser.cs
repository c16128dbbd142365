using System.Globalization;

namespace Boltup.Config.Units;

/// <summary>Reads a number with its unit, independent of the culture of the machine.</summary>
public static class QuantityParser
{
    private const NumberStyles Style = NumberStyles.AllowLeadingSign | NumberStyles.AllowDecimalPoint | NumberStyles.AllowExponent;

    /// <summary>Reads a quantity of one of the given dimensions.</summary>
    public static ParsedQuantity Parse(string text, params ReadOnlySpan<Dimension> dimensions)
    {
        string trimmed = text.Trim();
        int end = NumberLength(trimmed);
        string number = trimmed[..end];
        string unitText = trimmed[end..].Trim();
        if (unitText.StartsWith(',') && end > 0 && HasDigitAfterComma(unitText))
        {
            return new ParsedQuantity(QuantityFault.DecimalComma, 0, number, unitText, null);
        }

        if (!TryParseNumber(number, out double value))
        {
            return new ParsedQuantity(QuantityFault.NotANumber, 0, "", trimmed, null);
        }

        if (unitText.Length == 0)
        {
            return new ParsedQuantity(QuantityFault.NoUnit, 0, number, "", null);
        }

        Unit? unit = UnitTable.Find(unitText);
        QuantityFault fault = unit is null ? QuantityFault.UnknownUnit
            : dimensions.Contains(unit.Dimension) ? QuantityFault.None : QuantityFault.WrongDimension;
        return new ParsedQuantity(fault, fault == QuantityFault.None ? unit!.ToSi(value) : 0, number, unitText, unit);
    }

    /// <summary>Reads a bare finite number: digits, a decimal point, an exponent, nothing else.</summary>
    public static bool TryParseNumber(string text, out double value) =>
        double.TryParse(text, Style, CultureInfo.InvariantCulture, out value) && double.IsFinite(value)
        && NumberLength(text) == text.Length;

    private static bool HasDigitAfterComma(string text) => text.Length > 1 && char.IsAsciiDigit(text[1]);

    /// <summary>Length of the longest number at the start, so that the <c>e</c> of an exponent needs digits behind it.</summary>
    private static int NumberLength(string text)
    {
        int at = SkipDigits(text, text.Length > 0 && text[0] is '+' or '-' ? 1 : 0);
        if (at < text.Length && text[at] == '.')
        {
            at = SkipDigits(text, at + 1);
        }

        if (at < text.Length && text[at] is 'e' or 'E')
        {
            int sign = at + 1 < text.Length && text[at + 1] is '+' or '-' ? at + 2 : at + 1;
            int end = SkipDigits(text, sign);
            at = end > sign ? end : at;
        }

        return at;
    }

    private static int SkipDigits(string text, int at)
    {
        while (at < text.Length && char.IsAsciiDigit(text[at]))
        {
            at++;
        }

        return at;
    }
}
