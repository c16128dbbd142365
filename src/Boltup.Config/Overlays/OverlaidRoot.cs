using Boltup.Config.Yaml;

namespace Boltup.Config.Overlays;

/// <summary>A document with its bases merged in.</summary>
/// <param name="Bases">The files it is based on, nearest first.</param>
internal sealed record OverlaidRoot(YamlMap Root, IReadOnlyList<SourceFile> Bases);
