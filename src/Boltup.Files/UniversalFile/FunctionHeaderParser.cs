using System.Globalization;

namespace Boltup.Files.UniversalFile;

/// <summary>Reads the header lines of a dataset 58 by their columns.</summary>
internal static class FunctionHeaderParser
{
    public const int LineCount = 11;

    /// <summary>The header, or null with the index of the line that cannot be understood and the reason.</summary>
    /// <param name="lines">Eleven lines.</param>
    public static FunctionHeader? Parse(IReadOnlyList<string> lines, Liberties liberties, out int badLine, out string reason)
    {
        badLine = 5;
        reason = "expected function type, response and reference in fixed columns";
        string six = lines[5];
        if (!FixedColumns.TryInteger(six, 0, 5, out int functionType)
            || !TryChannel(six, 31, out ChannelField? response)
            || !TryChannel(six, 56, out ChannelField? reference))
        {
            return null;
        }

        badLine = 6;
        reason = "expected data type, number of values, spacing, first abscissa and step";
        string seven = lines[6];
        if (!FixedColumns.TryInteger(seven, 0, 10, out int ordinateType)
            || !FixedColumns.TryInteger(seven, 10, 10, out int count)
            || !FixedColumns.TryInteger(seven, 20, 10, out int spacing)
            || !TryAbscissa(seven, liberties, out double first, out double step))
        {
            return null;
        }

        if (ordinateType is not (2 or 4 or 5 or 6) || count < 1)
        {
            reason = FormattableString.Invariant($"found data type {ordinateType} with {count} values, expected type 2, 4, 5 or 6 and at least one value");
            return null;
        }

        var axes = new AxisField[4];
        for (int i = 0; i < axes.Length; i++)
        {
            badLine = 7 + i;
            reason = "expected data type and unit exponents of an axis";
            if (!TryAxis(lines[7 + i], out axes[i]!))
            {
                return null;
            }
        }

        return new FunctionHeader
        {
            IdLines = [.. lines.Take(5).Select(line => line.Trim())],
            FunctionType = functionType,
            Response = response!,
            Reference = reference!,
            OrdinateType = ordinateType,
            Count = count,
            IsEven = spacing == 1,
            First = first,
            Step = step,
            Abscissa = axes[0],
            Numerator = axes[1],
            Denominator = axes[2],
        };
    }

    private static bool TryChannel(string line, int start, out ChannelField? channel)
    {
        bool fine = FixedColumns.TryInteger(line, start + 10, 10, out int node) & FixedColumns.TryInteger(line, start + 20, 4, out int direction);
        channel = fine ? new ChannelField(FixedColumns.Text(line, start, 10), node, direction) : null;
        return fine;
    }

    /// <summary>First abscissa and step in columns of 13, or wherever the numbers stand.</summary>
    private static bool TryAbscissa(string line, Liberties liberties, out double first, out double step)
    {
        if (FixedColumns.TryReal(line, 30, 13, out first) && FixedColumns.TryReal(line, 43, 13, out step))
        {
            return true;
        }

        step = 0;
        string[] rest = line.Length > 30 ? SplitNumbers(line[30..]) : [];
        bool fine = rest.Length >= 2
            && double.TryParse(rest[0], NumberStyles.Float, CultureInfo.InvariantCulture, out first)
            && double.TryParse(rest[1], NumberStyles.Float, CultureInfo.InvariantCulture, out step);
        if (fine)
        {
            liberties.Take(Liberty.NarrowAbscissa);
        }

        return fine;
    }

    /// <summary>Numbers that touch each other: a sign that does not follow an exponent letter begins the next one.</summary>
    private static string[] SplitNumbers(string text)
    {
        var spaced = new System.Text.StringBuilder();
        for (int i = 0; i < text.Length; i++)
        {
            bool begins = text[i] is '+' or '-' && i > 0 && !"EeDd ".Contains(text[i - 1], StringComparison.Ordinal);
            spaced.Append(begins ? " " : "").Append(text[i] is 'D' or 'd' ? 'E' : text[i]);
        }

        return spaced.ToString().Split(' ', StringSplitOptions.RemoveEmptyEntries);
    }

    private static bool TryAxis(string line, out AxisField? axis)
    {
        bool fine = FixedColumns.TryInteger(line, 0, 10, out int type)
            & FixedColumns.TryInteger(line, 10, 5, out int length)
            & FixedColumns.TryInteger(line, 15, 5, out int force)
            & FixedColumns.TryInteger(line, 20, 5, out _);
        axis = fine ? new AxisField(type, length, force, FixedColumns.Text(line, 26, 20), FixedColumns.Text(line, 47, 20)) : null;
        return fine;
    }
}
