using Boltup.Engine.Diagnostics;

namespace Boltup.Config.Yaml;

/// <summary>A node of a YAML document that remembers where it was written.</summary>
/// <param name="Source">The file it was written in; after an overlay not every node of a tree has the same.</param>
/// <param name="Span">Where it is. A map or list in block style has the place of the key that holds it.</param>
public abstract record YamlNode(SourceFile Source, SourceSpan Span)
{
    /// <summary>What it is in the words of a message, with its article.</summary>
    public abstract string Describe();
}
