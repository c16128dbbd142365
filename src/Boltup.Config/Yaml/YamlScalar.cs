using Boltup.Engine.Diagnostics;

namespace Boltup.Config.Yaml;

/// <summary>A single value, as text.</summary>
/// <param name="IsPlain">Whether it is written without quotes.</param>
public sealed record YamlScalar(SourceFile Source, SourceSpan Span, string Text, bool IsPlain) : YamlNode(Source, Span)
{
    /// <summary>Whether nothing is written; its place is then that of its key.</summary>
    public bool IsEmpty => IsPlain && Text.Length == 0;

    /// <summary>Whether it is the <c>~</c> (or <c>null</c>) by which an overlay removes a key.</summary>
    public bool IsRemoval => IsPlain && Text is "~" or "null" or "Null" or "NULL";

    public override string Describe() => IsEmpty ? "nothing" : $"`{Excerpt.Of(Text)}`";
}
