using Boltup.Engine.Diagnostics;

namespace Boltup.Config.Yaml;

/// <summary>A list of nodes.</summary>
public sealed record YamlList(SourceFile Source, SourceSpan Span, IReadOnlyList<YamlNode> Items) : YamlNode(Source, Span)
{
    public override string Describe() => "a list";
}
