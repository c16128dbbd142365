using Boltup.Engine.Diagnostics;

namespace Boltup.Config.Binding;

/// <summary>A value of a document with the place where it is written, for later steps that may have to complain about it.</summary>
public sealed record Marked<T>(T Value, SourceSpan Span)
{
    public override string ToString() => $"{Value}";
}
