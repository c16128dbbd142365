using Boltup.Engine.Diagnostics;

namespace Boltup.Reports.Diagnostics;

/// <summary>Renders diagnostics for people: message, place, the line itself with carets, notes and cures.</summary>
public sealed class DiagnosticText(TextWriter output, Ink ink)
{
    private const int TabWidth = 4;
    private const int WidestLine = 120;
    private const int LargestFile = 8 << 20;

    private readonly Dictionary<string, string[]?> _files = [];

    /// <summary>Writes diagnostics in full, and a closing count when there are errors or warnings.</summary>
    public void WriteAll(IReadOnlyList<Diagnostic> diagnostics)
    {
        foreach (Diagnostic diagnostic in diagnostics)
        {
            Write(diagnostic);
        }

        if (Count(diagnostics) is { } count)
        {
            output.WriteLine(ink.Strong(count));
        }
    }

    /// <summary>One diagnostic in full, with an empty line behind it.</summary>
    public void Write(Diagnostic diagnostic)
    {
        string head = $"{WordOf(diagnostic.Severity)}[{diagnostic.Code}]";
        output.WriteLine($"{Coloured(diagnostic.Severity, head)}: {ink.Strong(Harmless(diagnostic.Message))}");
        if (diagnostic.Span is { } span)
        {
            WritePlace(span, diagnostic.Severity);
        }

        foreach (string note in diagnostic.Notes)
        {
            output.WriteLine($"{ink.Note("note")}: {Harmless(note)}");
        }

        foreach (string help in diagnostic.Helps)
        {
            output.WriteLine($"{ink.Help("help")}: {Harmless(help)}");
        }

        output.WriteLine();
    }

    /// <summary><c>file:line:column: error[CODE]: message</c>, for editors and search.</summary>
    public static string OneLine(Diagnostic diagnostic)
    {
        string place = diagnostic.Span is { } span ? $"{Harmless(span.ToString())}: " : "";
        return $"{place}{WordOf(diagnostic.Severity)}[{diagnostic.Code}]: {Harmless(diagnostic.Message)}";
    }

    /// <summary>Such as <c>2 errors, 1 warning</c>; null when there are neither.</summary>
    public static string? Count(IReadOnlyList<Diagnostic> diagnostics)
    {
        string[] counts = [.. new[] { (Severity.Error, "error"), (Severity.Warning, "warning") }
            .Select(kind => (Count: diagnostics.Count(item => item.Severity == kind.Item1), Word: kind.Item2))
            .Where(kind => kind.Count > 0)
            .Select(kind => $"{kind.Count} {kind.Word}{(kind.Count == 1 ? "" : "s")}")];
        return counts.Length == 0 ? null : string.Join(", ", counts);
    }

    public static string WordOf(Severity severity) => severity switch
    {
        Severity.Error => "error",
        Severity.Warning => "warning",
        _ => "note",
    };

    private string Coloured(Severity severity, string text) => severity switch
    {
        Severity.Error => ink.Error(text),
        Severity.Warning => ink.Warning(text),
        _ => ink.Note(text),
    };

    private void WritePlace(SourceSpan span, Severity severity)
    {
        output.WriteLine($"  {ink.Frame("-->")} {Harmless(span.ToString())}");
        if (span.Line > 0 && LinesOf(span.File) is { } lines && span.Line <= lines.Length)
        {
            WriteExcerpt(lines[span.Line - 1], span, severity);
        }
    }

    private void WriteExcerpt(string line, SourceSpan span, Severity severity)
    {
        string number = FormattableString.Invariant($"{span.Line}");
        string gutter = new(' ', number.Length + 1);
        string bar = ink.Frame("|");
        int column = Math.Clamp(span.Column, 1, line.Length + 1);
        string before = Expand(line[..(column - 1)]);
        string marked = Expand(line.Substring(column - 1, Math.Clamp(span.Length, 0, line.Length - column + 1)));
        string shown = before + marked + Expand(line[Math.Min(line.Length, column - 1 + span.Length)..]);
        int cut = Math.Max(0, before.Length + Math.Min(marked.Length, 20) - WidestLine);
        shown = shown[cut..];
        shown = shown.Length > WidestLine ? shown[..WidestLine] + " …" : shown;
        output.WriteLine($"{gutter}{bar}");
        output.WriteLine($"{ink.Frame(number)} {bar} {(cut > 0 ? "… " : "")}{shown}");
        if (span.Column > 0)
        {
            int width = Math.Clamp(marked.Length, 1, Math.Max(1, WidestLine - (before.Length - cut)));
            output.WriteLine($"{gutter}{bar} {(cut > 0 ? "  " : "")}{new string(' ', before.Length - cut)}{Coloured(severity, new string('^', width))}");
        }
    }

    private static string Expand(string text) => Harmless(text.Replace("\t", new string(' ', TabWidth), StringComparison.Ordinal));

    /// <summary>A file must not steer the terminal: control characters are shown as a replacement character.</summary>
    private static string Harmless(string text) =>
        text.Any(char.IsControl) ? string.Concat(text.Select(c => char.IsControl(c) ? '\ufffd' : c)) : text;

    /// <summary>A file that cannot be read again, or would take long to read, has no excerpt.</summary>
    private string[]? LinesOf(string file)
    {
        if (!_files.TryGetValue(file, out string[]? lines))
        {
            try
            {
                lines = new FileInfo(file).Length <= LargestFile ? File.ReadAllLines(file) : null;
            }
            catch (Exception exception) when (exception is IOException or UnauthorizedAccessException)
            {
                lines = null;
            }

            _files.Add(file, lines);
        }

        return lines;
    }
}
