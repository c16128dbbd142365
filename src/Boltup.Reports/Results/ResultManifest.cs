namespace Boltup.Reports.Results;

/// <summary>The list, inside an output folder, of the files in it that are ours. Whatever it does not name is never deleted or overwritten.</summary>
internal static class ResultManifest
{
    public const string FileName = ".boltup-files";

    /// <summary>Names of our files in a folder, the list itself among them.</summary>
    public static HashSet<string> Read(string folder)
    {
        string path = Path.Combine(folder, FileName);
        IEnumerable<string> names = File.Exists(path) ? File.ReadLines(path) : [];

        // A list that was tampered with must not reach outside its folder.
        return [FileName, .. names.Where(name => name.Length > 0 && name is not ("." or "..") && Path.GetFileName(name) == name)];
    }

    public static void Write(string folder, IEnumerable<string> names) =>
        File.WriteAllText(Path.Combine(folder, FileName), string.Concat(names.Select(name => name + "\n")));

    /// <summary>Deletes the named files of a folder, and the folder itself if nothing else is in it.</summary>
    public static void Delete(string folder, IEnumerable<string> names)
    {
        foreach (string name in names)
        {
            File.Delete(Path.Combine(folder, name));
        }

        if (!Directory.EnumerateFileSystemEntries(folder).Any())
        {
            Directory.Delete(folder);
        }
    }
}
