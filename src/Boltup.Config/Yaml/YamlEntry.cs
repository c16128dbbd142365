using Boltup.Engine.Diagnostics;

namespace Boltup.Config.Yaml;

/// <summary>A key of a map with its value.</summary>
/// <param name="KeyIsPlain">Whether the key is written without quotes.</param>
public sealed record YamlEntry(string Key, SourceSpan KeySpan, bool KeyIsPlain, YamlNode Value);
