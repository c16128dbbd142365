namespace Boltup.Reports.Results;

/// <summary>Puts a folder of new results in the place of another.</summary>
internal static class FolderReplacement
{
    /// <summary>Replaces our files in <paramref name="target"/> by those of <paramref name="staging"/>; all others stay.</summary>
    /// <param name="written">Names of the new files, without the manifest.</param>
    /// <returns>Names of foreign files that could not be carried over and now lie in <paramref name="staging"/>.</returns>
    public static IReadOnlyList<string> Apply(string staging, string target, IReadOnlyList<string> written)
    {
        if (!Directory.Exists(target))
        {
            Directory.Move(staging, target);
            return [];
        }

        if (IsStoodIn(target) || !TryChangePlaces(staging, target))
        {
            MoveFiles(staging, target, written);
            return [];
        }

        IReadOnlyList<string> left = CarryForeign(staging, target);
        ResultManifest.Delete(staging, ResultManifest.Read(staging));
        return left;
    }

    /// <summary>Whether the working folder is the target or inside it: exchanged, it would be gone under the user's feet.</summary>
    private static bool IsStoodIn(string target) =>
        $"{Directory.GetCurrentDirectory()}/".StartsWith($"{target.TrimEnd('/')}/", StringComparison.Ordinal);

    /// <returns>False where the folder cannot be renamed, such as a mount point, and nothing has happened.</returns>
    private static bool TryChangePlaces(string staging, string target) =>
        FolderExchange.TryExchange(staging, target) || TryRenameTwice(staging, target);

    private static bool TryRenameTwice(string staging, string target)
    {
        string old = $"{staging}.old";
        try
        {
            Directory.Move(target, old);
        }
        catch (Exception exception) when (exception is IOException or UnauthorizedAccessException)
        {
            return false;
        }

        try
        {
            Directory.Move(staging, target);
        }
        catch (IOException)
        {
            Directory.Move(old, target);
            throw;
        }

        Directory.Move(old, staging);
        return true;
    }

    private static List<string> CarryForeign(string from, string to)
    {
        HashSet<string> ours = ResultManifest.Read(from);
        var left = new List<string>();
        foreach (string path in Directory.GetFileSystemEntries(from))
        {
            string name = Path.GetFileName(path);
            if (!ours.Contains(name) && !TryMove(path, Path.Combine(to, name)))
            {
                left.Add(name);
            }
        }

        return left;
    }

    private static bool TryMove(string from, string to)
    {
        try
        {
            Directory.Move(from, to);
            return true;
        }
        catch (Exception exception) when (exception is IOException or UnauthorizedAccessException)
        {
            return false;
        }
    }

    /// <summary>Whole files change at a time, not the whole folder. The manifest names old and new ones until all is done.</summary>
    private static void MoveFiles(string staging, string target, IReadOnlyList<string> written)
    {
        HashSet<string> before = ResultManifest.Read(target);
        ResultManifest.Write(target, before.Union(written).Where(name => name != ResultManifest.FileName));
        foreach (string name in written)
        {
            File.Move(Path.Combine(staging, name), Path.Combine(target, name), overwrite: true);
        }

        foreach (string name in before.Except([.. written, ResultManifest.FileName]))
        {
            File.Delete(Path.Combine(target, name));
        }

        File.Move(Path.Combine(staging, ResultManifest.FileName), Path.Combine(target, ResultManifest.FileName), overwrite: true);
        Directory.Delete(staging);
    }
}
