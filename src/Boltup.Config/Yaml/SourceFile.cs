namespace Boltup.Config.Yaml;

/// <summary>A file that was read.</summary>
/// <param name="FullPath">Absolute path.</param>
/// <param name="DisplayPath">Path as the user would type it; what spans carry.</param>
public sealed record SourceFile(string FullPath, string DisplayPath)
{
    /// <summary>Absolute path of the folder against which paths in this file are resolved.</summary>
    public string Folder => Path.GetDirectoryName(FullPath)!;
}
