using System.Text;
using Boltup.Engine.Diagnostics;
using Boltup.Files.Text;

namespace Boltup.Files.UniversalFile;

/// <summary>Reads the rows of an ASCII record, by columns: numbers may touch each other.</summary>
internal static class AsciiData
{
    /// <summary>Reads as many numbers as there is room for.</summary>
    /// <param name="forms">Gathers the forms of numbers that were met.</param>
    /// <param name="numbers">Abscissa (where there is one) and parts of each point in turn.</param>
    public static bool Read(
        LineReader lines, DataLayout layout, Span<double> numbers, string displayPath, DiagnosticBag diagnostics, ref NumberForms forms)
    {
        int[] widths = layout.RowWidths;
        lines.MoveTo(layout.Offset);
        int filled = 0;
        for (int row = 0; filled < numbers.Length; row++)
        {
            lines.TryRead(out ReadOnlySpan<byte> line);
            int start = 0;
            for (int field = 0; field < widths.Length && filled < numbers.Length; field++)
            {
                int end = Math.Min(start + widths[field], line.Length);
                if (start >= end || !TryField(line[start..end], out numbers[filled], field > 0, ref forms))
                {
                    SourceSpan place = layout.FirstLine > 0
                        ? new(displayPath, layout.FirstLine + row, Math.Min(start, line.Length) + 1, Math.Max(1, end - start))
                        : new(displayPath, ByteOffset: lines.LineStart + start);
                    Refuse(line[Math.Min(start, line.Length)..Math.Max(Math.Min(start, line.Length), end)], place, diagnostics);
                    return false;
                }

                filled++;
                start = end;
            }
        }

        return true;
    }

    private static bool TryField(ReadOnlySpan<byte> field, out double value, bool hasNeighbour, ref NumberForms forms)
    {
        bool fine = NumberParser.TryParse(field[^1] == ' ' ? Blanks.TrimEnd(field) : field, out value, ref forms);
        forms |= hasNeighbour && field[0] != ' ' ? NumberForms.Touching : NumberForms.Plain;
        return fine;
    }

    /// <summary>Number of fields that a row really holds.</summary>
    public static int FieldsIn(ReadOnlySpan<byte> line, int[] widths)
    {
        int length = Blanks.TrimEnd(line).Length;
        int fields = 0;
        for (int start = 0; fields < widths.Length && start < length; fields++)
        {
            start += widths[fields];
        }

        return fields;
    }

    private static void Refuse(ReadOnlySpan<byte> field, SourceSpan place, DiagnosticBag diagnostics) =>
        diagnostics.Error(
            FileCodes.BadNumber,
            $"`{Encoding.Latin1.GetString(field).Trim()}` is no number",
            place,
            "export the file again; values stand in fixed columns of 13 or 20");
}
