namespace Boltup.Cli.Terminal;

/// <summary>A plain table in aligned columns, two blanks apart, with a line under its heads.</summary>
internal sealed class TextTable(params (string Head, bool AlignsRight)[] columns)
{
    private const string Gap = "  ";

    private readonly List<string[]> _rows = [];

    /// <param name="cells">One text per column.</param>
    public void Add(params string[] cells) => _rows.Add(cells);

    public void Write(TextWriter output)
    {
        int[] widths = [.. columns.Select((column, i) => _rows.Select(row => row[i].Length).Append(column.Head.Length).Max())];
        output.WriteLine(Line(widths, [.. columns.Select(column => column.Head)]));
        output.WriteLine(Line(widths, [.. widths.Select(width => new string('─', width))]));
        foreach (string[] row in _rows)
        {
            output.WriteLine(Line(widths, row));
        }
    }

    private string Line(int[] widths, string[] cells) =>
        string.Join(Gap, cells.Select((cell, i) => columns[i].AlignsRight ? cell.PadLeft(widths[i]) : cell.PadRight(widths[i]))).TrimEnd();
}
