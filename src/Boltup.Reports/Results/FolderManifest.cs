namespace Boltup.Reports.Results;

/// <summary>Tells, inside a folder of results, the files that Boltup wrote from those that it did not.</summary>
internal static class FolderManifest
{
    /// <summary>Lists the files of a finished run.</summary>
    public const string FileName = ".boltup-files";

    /// <summary>Lists the files of a run under way, each before it is made; held open as long as the run lives.</summary>
    public const string Journal = ".boltup-journal";

    /// <summary>Names of the files in a folder that Boltup wrote, with a slash where they are in a subfolder. Nothing outside is ours.</summary>
    public static string[] OwnFilesIn(string folder)
    {
        HashSet<string> listed = [FileName, Journal, .. NamesIn(folder, FileName), .. NamesIn(folder, Journal)];
        return [.. listed.Where(name => IsInside(folder, name) && File.Exists(Path.Combine(folder, name))).Order(StringComparer.Ordinal)];
    }

    /// <summary>Names of files and folders that Boltup did not write, or that are the work of a run under way.</summary>
    public static string[] ForeignEntriesIn(string folder)
    {
        HashSet<string> own = [.. OwnFilesIn(folder)];
        HashSet<string> shared = [.. own.Where(IsInSubfolder).Select(SubfolderOf)];
        IEnumerable<string> entries = Directory.EnumerateFileSystemEntries(folder).Select(entry => Path.GetFileName(entry)!);
        return [.. entries
            .SelectMany(name => shared.Contains(name)
                ? Directory.EnumerateFileSystemEntries(Path.Combine(folder, name)).Select(entry => $"{name}/{Path.GetFileName(entry)}")
                : [name])
            .Where(name => !own.Contains(name))];
    }

    /// <summary>Deletes what Boltup wrote, and the folder when nothing else is in it.</summary>
    public static void RemoveOwn(string folder)
    {
        if (!Directory.Exists(folder))
        {
            return;
        }

        // The lists go last: a removal that is cut short can be taken up again.
        string[] own = OwnFilesIn(folder);
        foreach (string name in own.OrderBy(name => name is FileName or Journal))
        {
            File.Delete(Path.Combine(folder, name));
        }

        IEnumerable<string> subfolders = own.Where(IsInSubfolder).Select(SubfolderOf).Distinct().Select(name => Path.Combine(folder, name));
        foreach (string left in subfolders.Append(folder).Where(left => !Directory.EnumerateFileSystemEntries(left).Any()))
        {
            Directory.Delete(left);
        }
    }

    private static bool IsInSubfolder(string name) => name.Contains('/', StringComparison.Ordinal);

    private static string SubfolderOf(string name) => name[..name.IndexOf('/', StringComparison.Ordinal)];

    /// <summary>Whether a name stays in the folder or in a real subfolder of it: a list may have been edited, a subfolder become a link.</summary>
    private static bool IsInside(string folder, string name)
    {
        string[] pieces = name.Split('/');
        return pieces.Length <= 2
            && !pieces.Contains("..") && !Path.IsPathRooted(name)
            && (pieces.Length == 1 || new DirectoryInfo(Path.Combine(folder, pieces[0])).LinkTarget is null);
    }

    private static string[] NamesIn(string folder, string list)
    {
        string path = Path.Combine(folder, list);
        if (!File.Exists(path))
        {
            return [];
        }

        using var stream = new FileStream(path, FileMode.Open, FileAccess.Read, FileShare.ReadWrite | FileShare.Delete);
        using var reader = new StreamReader(stream);
        return reader.ReadToEnd().Split('\n', StringSplitOptions.RemoveEmptyEntries | StringSplitOptions.TrimEntries);
    }
}
