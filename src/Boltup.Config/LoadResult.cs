using Boltup.Config.Yaml;

namespace Boltup.Config;

/// <summary>What loading gave.</summary>
/// <param name="Document">The document, or null when there were errors.</param>
/// <param name="FilesRead">Every YAML file that was read, in the order of reading, each once.</param>
public sealed record LoadResult<T>(T? Document, IReadOnlyList<SourceFile> FilesRead)
    where T : class;
