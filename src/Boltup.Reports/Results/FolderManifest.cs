namespace Boltup.Reports.Results;

/// <summary>Tells, inside a folder of results, the files that Boltup wrote from those that it did not.</summary>
internal static class FolderManifest
{
    /// <summary>Lists the files of a finished run.</summary>
    public const string FileName = ".boltup-files";

    /// <summary>Lists the files of a run under way, each before it is made; held open as long as the run lives.</summary>
    public const string Journal = ".boltup-journal";

    /// <summary>Names of the files in a folder that Boltup wrote. Folders are never ours, nor is anything outside.</summary>
    public static string[] OwnFilesIn(string folder)
    {
        HashSet<string> listed = [FileName, Journal, .. NamesIn(folder, FileName), .. NamesIn(folder, Journal)];
        return [.. Directory.EnumerateFiles(folder).Select(file => Path.GetFileName(file)!).Where(listed.Contains)];
    }

    /// <summary>Names of files and folders that Boltup did not write, or that are the work of a run under way.</summary>
    public static string[] ForeignEntriesIn(string folder)
    {
        HashSet<string> own = [.. OwnFilesIn(folder)];
        return [.. Directory.EnumerateFileSystemEntries(folder)
            .Select(entry => Path.GetFileName(entry)!)
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
        foreach (string name in OwnFilesIn(folder).OrderBy(name => name is FileName or Journal))
        {
            File.Delete(Path.Combine(folder, name));
        }

        if (!Directory.EnumerateFileSystemEntries(folder).Any())
        {
            Directory.Delete(folder);
        }
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
