namespace Boltup.Config.Paths;

/// <summary>Paths as the user would type them.</summary>
internal static class DisplayPath
{
    /// <summary>Relative to the working directory when the file is below it, otherwise absolute; with forward slashes.</summary>
    public static string Of(string fullPath, string workingDirectory)
    {
        string relative = Path.GetRelativePath(workingDirectory, fullPath);
        bool isBelow = !Path.IsPathRooted(relative) && relative != ".."
            && !relative.StartsWith($"..{Path.DirectorySeparatorChar}", StringComparison.Ordinal);
        return (isBelow ? relative : fullPath).Replace(Path.DirectorySeparatorChar, '/');
    }
}
