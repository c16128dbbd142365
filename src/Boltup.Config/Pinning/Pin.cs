namespace Boltup.Config.Pinning;

/// <summary>A data file and what it holds.</summary>
/// <param name="Path">Relative to the folder of the pins, with forward slashes.</param>
/// <param name="FullPath">Absolute path.</param>
/// <param name="Sha256">64 lower-case hexadecimal digits.</param>
public sealed record Pin(string Path, string FullPath, string Sha256)
{
    internal static Pin Of(string fullPath, string folder) =>
        new(System.IO.Path.GetRelativePath(folder, fullPath).Replace(System.IO.Path.DirectorySeparatorChar, '/'), fullPath, FileDigest.Of(fullPath));
}
