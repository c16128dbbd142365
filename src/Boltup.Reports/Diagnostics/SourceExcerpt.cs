namespace Boltup.Reports.Diagnostics;

/// <summary>The part of a source line that fits a terminal, and where its marked text stands in it.</summary>
/// <param name="Text">What to show: tabs as blanks, other control characters as replacement characters.</param>
/// <param name="MarkAt">Blanks before the first caret.</param>
/// <param name="MarkWidth">Number of carets, at least 1.</param>
internal readonly record struct SourceExcerpt(string Text, int MarkAt, int MarkWidth)
{
    private const string Tab = "    ";
    private const string Cut = "… ";
    private const int WidestText = 120;

    /// <summary>Room for marked text at the right end of a line that is cut at its left.</summary>
    private const int MarkRoom = 20;

    /// <param name="line">The whole line.</param>
    /// <param name="column">Where the marked text begins, from 1; 0 marks nothing in particular.</param>
    /// <param name="length">Its length in characters.</param>
    public static SourceExcerpt Of(string line, int column, int length)
    {
        int from = Math.Clamp(column - 1, 0, line.Length);
        int to = from + Math.Clamp(length, 0, line.Length - from);
        string before = Shown(line[..from]);
        string marked = Shown(line[from..to]);
        int hidden = Math.Max(0, before.Length + Math.Min(marked.Length, MarkRoom) - WidestText);
        string text = (before + marked + Shown(line[to..]))[hidden..];
        string left = hidden > 0 ? Cut : "";
        int markAt = before.Length - hidden;
        return new SourceExcerpt(
            left + (text.Length > WidestText ? text[..WidestText] + " …" : text),
            left.Length + markAt,
            Math.Clamp(marked.Length, 1, Math.Max(1, WidestText - markAt)));
    }

    private static string Shown(string text) => DiagnosticText.Harmless(text.Replace("\t", Tab, StringComparison.Ordinal));
}
