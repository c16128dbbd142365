using Boltup.Engine.Diagnostics;

namespace Boltup.Files.UniversalFile;

/// <summary>A note to come.</summary>
/// <param name="Span">Where the liberty was taken first.</param>
internal sealed record TakenLiberty(DiagnosticCode Code, string Text, SourceSpan Span)
{
    /// <summary>How often it was taken.</summary>
    public int Count { get; set; }
}
