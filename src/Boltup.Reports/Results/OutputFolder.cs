using Boltup.Engine.Diagnostics;

namespace Boltup.Reports.Results;

/// <summary>
/// Replaces the results in a folder as a whole: everything is written beside it first, then both folders change places. A run that fails
/// or is killed leaves the earlier results as they were. Files that Boltup did not write are carried over.
/// </summary>
public sealed class OutputFolder : IDisposable
{
    /// <summary>Lists, inside the folder, the files that are ours.</summary>
    public const string Manifest = ".boltup-files";

    private readonly string _target;
    private readonly string _staging;
    private readonly List<string> _written = [];
    private readonly Lock _lock = new();

    private OutputFolder(string target)
    {
        _target = target;
        _staging = $"{target}.boltup-{Environment.ProcessId}";
    }

    /// <summary>Prepares to replace a folder.</summary>
    /// <returns>The folder, or null after an error in <paramref name="diagnostics"/>.</returns>
    public static OutputFolder? Prepare(string path, DiagnosticBag diagnostics)
    {
        var folder = new OutputFolder(Path.GetFullPath(path).TrimEnd(Path.DirectorySeparatorChar));
        try
        {
            folder.DeleteStaging();
            Directory.CreateDirectory(folder._staging);
            return folder;
        }
        catch (Exception exception) when (exception is IOException or UnauthorizedAccessException)
        {
            SayCannotWrite(path, exception, diagnostics);
            return null;
        }
    }

    /// <summary>Writes one file; may be called from several threads.</summary>
    public void Write(string name, Action<Stream> write)
    {
        using (FileStream stream = File.Create(Path.Combine(_staging, name)))
        {
            write(stream);
        }

        lock (_lock)
        {
            _written.Add(name);
        }
    }

    /// <summary>Puts the new files in place of the old ones.</summary>
    /// <returns>Names of the files written, sorted; null after an error in <paramref name="diagnostics"/>.</returns>
    public IReadOnlyList<string>? Commit(DiagnosticBag diagnostics)
    {
        _written.Sort(StringComparer.Ordinal);
        try
        {
            string[] foreign = ForeignFiles();
            string[] inTheWay = [.. foreign.Intersect(_written)];
            if (inTheWay.Length > 0)
            {
                SayForeign(inTheWay, diagnostics);
                return null;
            }

            File.WriteAllLines(Path.Combine(_staging, Manifest), _written);
            Swap(foreign);
            return _written;
        }
        catch (Exception exception) when (exception is IOException or UnauthorizedAccessException)
        {
            SayCannotWrite(_target, exception, diagnostics);
            return null;
        }
    }

    /// <summary>Removes what an unfinished run has written.</summary>
    public void Dispose() => DeleteStaging();

    private static void SayCannotWrite(string path, Exception exception, DiagnosticBag diagnostics) => diagnostics.Error(
        ReportCodes.CannotWrite,
        $"results cannot be written to `{path}`",
        help: "choose another folder with `-o`",
        notes: exception.Message);

    private void SayForeign(string[] inTheWay, DiagnosticBag diagnostics) => diagnostics.Error(
        ReportCodes.ForeignFile,
        $"`{_target}` holds {string.Join(", ", inTheWay.Select(name => $"`{name}`"))}, which Boltup did not write",
        help: "choose another folder with `-o`, or move the file away");

    private void DeleteStaging()
    {
        if (Directory.Exists(_staging))
        {
            Directory.Delete(_staging, recursive: true);
        }
    }

    /// <summary>Files and folders in the target that no earlier run wrote.</summary>
    private string[] ForeignFiles()
    {
        if (!Directory.Exists(_target))
        {
            return [];
        }

        string manifest = Path.Combine(_target, Manifest);
        HashSet<string> ours = [Manifest, .. File.Exists(manifest) ? File.ReadAllLines(manifest) : []];
        return [.. Directory.EnumerateFileSystemEntries(_target).Select(entry => Path.GetFileName(entry)!).Where(name => !ours.Contains(name))];
    }

    private void Swap(string[] foreign)
    {
        if (!Directory.Exists(_target))
        {
            Directory.Move(_staging, _target);
            return;
        }

        if (!FolderExchange.TryExchange(_staging, _target))
        {
            string old = $"{_staging}.old";
            Directory.Move(_target, old);
            Directory.Move(_staging, _target);
            Directory.Move(old, _staging);
        }

        foreach (string name in foreign)
        {
            Directory.Move(Path.Combine(_staging, name), Path.Combine(_target, name));
        }

        DeleteStaging();
    }
}
