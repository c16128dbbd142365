namespace Boltup.Files.Csv;

/// <summary>Splits a row at its commas. Names may be quoted; quotes inside are doubled (RFC 4180).</summary>
internal static class CsvRow
{
    /// <summary>Finds the fields of a row.</summary>
    /// <param name="fields">Receives start and end of each field, without quotes.</param>
    /// <returns>Number of fields, which may exceed the room.</returns>
    public static int Split(ReadOnlySpan<byte> row, Span<Range> fields)
    {
        int count = 0;
        int start = 0;
        while (start <= row.Length)
        {
            int end = FieldEnd(row, start);
            if (count < fields.Length)
            {
                bool quoted = end - start >= 2 && row[start] == '"' && row[end - 1] == '"';
                fields[count] = quoted ? (start + 1)..(end - 1) : start..end;
            }

            count++;
            start = end + 1;
        }

        return count;
    }

    private static int FieldEnd(ReadOnlySpan<byte> row, int start)
    {
        bool quoted = start < row.Length && row[start] == '"';
        if (!quoted)
        {
            int comma = row[start..].IndexOf((byte)',');
            return comma < 0 ? row.Length : start + comma;
        }

        int i = start + 1;
        while (i < row.Length && (row[i] != '"' || (i + 1 < row.Length && row[i + 1] == '"')))
        {
            i += row[i] == '"' ? 2 : 1;
        }

        int end = row[Math.Min(i, row.Length)..].IndexOf((byte)',');
        return end < 0 ? row.Length : i + end;
    }
}
