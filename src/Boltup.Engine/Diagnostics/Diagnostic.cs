namespace Boltup.Engine.Diagnostics;

/// <summary>
/// Something to tell the user about the input or the data. Data only: renderers turn it into text or JSON.
/// Messages are lower case without a final stop, with names in backticks; the cure goes into <see cref="Helps"/>.
/// </summary>
public sealed record Diagnostic(DiagnosticCode Code, Severity Severity, string Message)
{
    /// <summary>Where it is, if it has a place.</summary>
    public SourceSpan? Span { get; init; }

    /// <summary>Found, expected, lines and frequencies concerned: facts that support the message.</summary>
    public IReadOnlyList<string> Notes { get; init; } = [];

    /// <summary>What to do, most likely cure first.</summary>
    public IReadOnlyList<string> Helps { get; init; } = [];
}
