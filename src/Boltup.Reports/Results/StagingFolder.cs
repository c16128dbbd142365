using System.Text;

namespace Boltup.Reports.Results;

/// <summary>
/// Where a run writes before its results take their place: beside the folder of results when that can be exchanged as a whole, inside it
/// otherwise. A journal held open marks it as in use, so that the leftovers of killed runs can be told from the work of live ones.
/// </summary>
internal sealed class StagingFolder : IDisposable
{
    private const string Mark = ".boltup-new-";

    private readonly FileStream _journal;
    private readonly List<string> _names = [];
    private readonly Lock _lock = new();

    private StagingFolder(string path, bool isBeside)
    {
        FullPath = path;
        IsBeside = isBeside;
        Directory.CreateDirectory(path);
        _journal = new FileStream(Path.Combine(path, FolderManifest.Journal), FileMode.CreateNew, FileAccess.Write, FileShare.None);
    }

    public string FullPath { get; }

    /// <summary>Whether it stands beside the results, and may change places with them.</summary>
    public bool IsBeside { get; }

    /// <summary>Makes a new, empty folder for results that shall go to <paramref name="target"/>.</summary>
    /// <exception cref="IOException">It cannot be made.</exception>
    /// <exception cref="UnauthorizedAccessException">It may not be made.</exception>
    public static StagingFolder For(string target)
    {
        string unique = Mark + Path.GetRandomFileName();
        if (!MustStay(target))
        {
            try
            {
                return new StagingFolder(target + unique, isBeside: true);
            }
            catch (UnauthorizedAccessException) when (Directory.Exists(target))
            {
                // A folder may be open to us where its parent is not.
            }
        }

        return new StagingFolder(Path.Combine(target, unique), isBeside: false);
    }

    /// <summary>Removes what killed runs have left; whatever Boltup did not write stays.</summary>
    public static void SweepLeftovers(string target)
    {
        string? parent = Path.GetDirectoryName(target);
        string[] beside = Directory.Exists(parent) ? Directory.GetDirectories(parent, $"{Path.GetFileName(target)}{Mark}*") : [];
        string[] inside = Directory.Exists(target) ? Directory.GetDirectories(target, $"{Mark}*") : [];
        foreach (string folder in beside.Concat(inside).Where(folder => !IsInUse(folder)))
        {
            TryRemove(folder);
        }
    }

    /// <summary>Writes one file; may be called from several threads.</summary>
    public void Write(string name, Action<Stream> write)
    {
        Claim(name);
        string path = Path.Combine(FullPath, name);
        Directory.CreateDirectory(Path.GetDirectoryName(path)!);
        using var stream = new FileStream(path, FileMode.CreateNew, FileAccess.Write);
        write(stream);
    }

    /// <summary>Notes a name in the journal, so that the file can be removed should the run be killed.</summary>
    public void Claim(string name)
    {
        lock (_lock)
        {
            _journal.Write(Encoding.UTF8.GetBytes($"{name}\n"));
            _journal.Flush();
            _names.Add(name);
        }
    }

    /// <summary>Lists the files for those who come later.</summary>
    /// <returns>Names of the files, sorted.</returns>
    public string[] Seal()
    {
        string[] names = [.. _names.Order(StringComparer.Ordinal)];
        File.WriteAllText(Path.Combine(FullPath, FolderManifest.FileName), string.Concat(names.Select(name => $"{name}\n")));
        return names;
    }

    /// <summary>Closes the journal: not every system moves a folder that holds an open file.</summary>
    public void Release() => _journal.Dispose();

    /// <summary>Removes what has not taken its place.</summary>
    public void Dispose()
    {
        Release();
        TryRemove(FullPath);
    }

    /// <summary>
    /// Files of others are never moved, and a working directory would go away under the feet of the shell that stands in it.
    /// </summary>
    private static bool MustStay(string target) => Directory.Exists(target)
        && (FolderManifest.ForeignEntriesIn(target).Length > 0 || IsAtOrAbove(target, Environment.CurrentDirectory));

    internal static bool IsAtOrAbove(string folder, string path) =>
        !Path.GetRelativePath(folder, path).Split(Path.DirectorySeparatorChar)[0].Equals("..", StringComparison.Ordinal);

    private static bool IsInUse(string folder)
    {
        string journal = Path.Combine(folder, FolderManifest.Journal);
        try
        {
            using FileStream? taken = File.Exists(journal) ? new FileStream(journal, FileMode.Open, FileAccess.Write, FileShare.None) : null;
            return false;
        }
        catch (Exception exception) when (exception is IOException or UnauthorizedAccessException)
        {
            return true;
        }
    }

    /// <summary>What cannot be removed now is a leftover for the next run.</summary>
    private static void TryRemove(string folder)
    {
        try
        {
            FolderManifest.RemoveOwn(folder);
        }
        catch (Exception exception) when (exception is IOException or UnauthorizedAccessException)
        {
        }
    }
}
