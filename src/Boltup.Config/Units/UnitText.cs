using System.Text;

namespace Boltup.Config.Units;

/// <summary>Brings the spellings of a unit into the one that the table uses.</summary>
internal static class UnitText
{
    private const char Dot = '·';

    /// <summary>
    /// The same unit with the middle dot for every product sign and for a space between symbols, superscript powers,
    /// the micro sign for the Greek letter, and no space around signs.
    /// </summary>
    public static string Normalize(string text)
    {
        var result = new StringBuilder(text.Length);
        foreach (char c in text.Replace("^2", "²", StringComparison.Ordinal).Replace("^3", "³", StringComparison.Ordinal))
        {
            Append(result, Same(c));
        }

        return result.ToString().TrimEnd(' ').Replace(' ', Dot);
    }

    private static char Same(char c) => c switch
    {
        '*' or '⋅' or '∙' or '•' => Dot,
        'μ' => 'µ',
        'º' => '°',
        '\u00A0' or '\u202F' or '\u2009' or '\t' => ' ',
        _ => c,
    };

    private static void Append(StringBuilder result, char c)
    {
        char last = result.Length == 0 ? ' ' : result[^1];
        if (c == ' ' && (last is ' ' || IsSign(last)))
        {
            return;
        }

        if (IsSign(c) && last == ' ' && result.Length > 0)
        {
            result.Length--;
        }

        result.Append(c);
    }

    private static bool IsSign(char c) => c is Dot or '/';
}
