namespace Boltup.Engine.Diagnostics;

/// <summary>Collects the diagnostics of a run, so that all of them are said at once. Not safe for concurrent use.</summary>
public sealed class DiagnosticBag
{
    private readonly List<Diagnostic> _items = [];

    public IReadOnlyList<Diagnostic> Items => _items;

    public bool HasErrors => _items.Exists(item => item.Severity == Severity.Error);

    public void Add(Diagnostic diagnostic) => _items.Add(diagnostic);

    public void AddRange(IEnumerable<Diagnostic> diagnostics) => _items.AddRange(diagnostics);

    /// <summary>Adds those that were not said yet, of the same place in the same words.</summary>
    public void AddUnsaid(IEnumerable<Diagnostic> diagnostics)
    {
        foreach (Diagnostic item in diagnostics)
        {
            if (!_items.Exists(known => known.Code == item.Code && known.Message == item.Message && known.Span == item.Span))
            {
                _items.Add(item);
            }
        }
    }

    public void Error(DiagnosticCode code, string message, SourceSpan? span = null, string? help = null, params string[] notes) =>
        Add(Build(code, Severity.Error, message, span, help, notes));

    public void Warning(DiagnosticCode code, string message, SourceSpan? span = null, string? help = null, params string[] notes) =>
        Add(Build(code, Severity.Warning, message, span, help, notes));

    public void Note(DiagnosticCode code, string message, SourceSpan? span = null, string? help = null, params string[] notes) =>
        Add(Build(code, Severity.Note, message, span, help, notes));

    private static Diagnostic Build(
        DiagnosticCode code, Severity severity, string message, SourceSpan? span, string? help, string[] notes) =>
        new(code, severity, message) { Span = span, Notes = notes, Helps = help is null ? [] : [help] };
}
