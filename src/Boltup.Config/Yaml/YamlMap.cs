using Boltup.Engine.Diagnostics;

namespace Boltup.Config.Yaml;

/// <summary>A map with its entries in the order of the file; no key occurs twice.</summary>
public sealed record YamlMap(SourceFile Source, SourceSpan Span, IReadOnlyList<YamlEntry> Entries) : YamlNode(Source, Span)
{
    private const int LinearLimit = 16;
    private Dictionary<string, YamlEntry>? _index;

    public YamlNode? this[string key] => Find(key)?.Value;

    public YamlEntry? Find(string key)
    {
        if (Entries.Count > LinearLimit)
        {
            _index ??= Entries.ToDictionary(entry => entry.Key, StringComparer.Ordinal);
            return _index.GetValueOrDefault(key);
        }

        foreach (YamlEntry entry in Entries)
        {
            if (entry.Key == key)
            {
                return entry;
            }
        }

        return null;
    }

    public override string Describe() => "a map";
}
