namespace Boltup.Config.Paths;

/// <summary>Resolves symbolic links, also those among the folders of a path.</summary>
internal static class RealPath
{
    private const int MaximumLinks = 40;

    /// <summary>The path without links; what does not exist is kept as it is written.</summary>
    public static string Of(string fullPath)
    {
        string path = fullPath;
        for (int i = 0; i < MaximumLinks; i++)
        {
            if (ResolveFirstLink(path) is not string resolved)
            {
                return path;
            }

            path = resolved;
        }

        return path;
    }

    /// <summary>The path with its first link replaced by what it points to, or null when there is none.</summary>
    private static string? ResolveFirstLink(string path)
    {
        string root = Path.GetPathRoot(path)!;
        string prefix = root;
        string[] pieces = path[root.Length..].Split(Path.DirectorySeparatorChar, StringSplitOptions.RemoveEmptyEntries);
        for (int i = 0; i < pieces.Length; i++)
        {
            string folder = prefix;
            prefix = Path.Combine(prefix, pieces[i]);
            if (LinkTarget(prefix) is string target)
            {
                return Path.GetFullPath(Path.Combine([folder, target, .. pieces[(i + 1)..]]));
            }
        }

        return null;
    }

    private static string? LinkTarget(string path)
    {
        try
        {
            return new FileInfo(path).LinkTarget;
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException)
        {
            return null;
        }
    }
}
