using Boltup.Engine.Diagnostics;

namespace Boltup.Reports.Diagnostics;

/// <summary>Renders diagnostics for people: message, place, the line itself with carets, notes and cures.</summary>
public sealed class DiagnosticText(TextWriter output, Ink ink)
{
    private readonly SourceLines _lines = new();

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

    /// <summary>A file must not steer the terminal: control characters are shown as a replacement character.</summary>
    internal static string Harmless(string text) =>
        text.Any(char.IsControl) ? string.Concat(text.Select(c => char.IsControl(c) ? '\ufffd' : c)) : text;

    private string Coloured(Severity severity, string text) => severity switch
    {
        Severity.Error => ink.Error(text),
        Severity.Warning => ink.Warning(text),
        _ => ink.Note(text),
    };

    private void WritePlace(SourceSpan span, Severity severity)
    {
        output.WriteLine($"  {ink.Frame("-->")} {Harmless(span.ToString())}");
        if (_lines.Find(span.File, span.Line) is { } line)
        {
            WriteExcerpt(SourceExcerpt.Of(line, span.Column, span.Length), span, severity);
        }
    }

    private void WriteExcerpt(SourceExcerpt excerpt, SourceSpan span, Severity severity)
    {
        string number = FormattableString.Invariant($"{span.Line}");
        string gutter = new(' ', number.Length + 1);
        string bar = ink.Frame("|");
        output.WriteLine($"{gutter}{bar}");
        output.WriteLine($"{ink.Frame(number)} {bar} {excerpt.Text}".TrimEnd());
        if (span.Column > 0)
        {
            string carets = Coloured(severity, new string('^', excerpt.MarkWidth));
            output.WriteLine($"{gutter}{bar} {new string(' ', excerpt.MarkAt)}{carets}");
        }
    }
}
