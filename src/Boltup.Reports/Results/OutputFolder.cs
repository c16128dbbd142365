using Boltup.Engine.Diagnostics;

namespace Boltup.Reports.Results;

/// <summary>
/// Replaces the results in a folder as a whole: everything is written elsewhere first. A folder that holds nothing but results changes places
/// with the new one in one step, so that a run that fails or is killed leaves the earlier results as they were. Beside files that Boltup did
/// not write, results are replaced file by file, and put back after a failure; those files are never moved or deleted.
/// </summary>
public sealed class OutputFolder : IDisposable
{
    /// <summary>Lists, inside the folder, the files that are ours.</summary>
    public const string Manifest = FolderManifest.FileName;

    private readonly string _target;
    private readonly StagingFolder _staging;
    private Exception? _failure;

    private OutputFolder(string target)
    {
        _target = target;
        StagingFolder.SweepLeftovers(target);
        _staging = StagingFolder.For(target);
    }

    /// <summary>Prepares to replace a folder.</summary>
    /// <returns>The folder, or null after an error in <paramref name="diagnostics"/>.</returns>
    public static OutputFolder? Prepare(string path, DiagnosticBag diagnostics)
    {
        try
        {
            var named = new DirectoryInfo(Path.TrimEndingDirectorySeparator(Path.GetFullPath(path)));
            FileSystemInfo target = named.LinkTarget is null ? named : named.ResolveLinkTarget(returnFinalTarget: true)!;
            return new OutputFolder(target.FullName);
        }
        catch (Exception exception) when (exception is IOException or UnauthorizedAccessException)
        {
            SayCannotWrite(path, exception, diagnostics);
            return null;
        }
    }

    /// <summary>
    /// Writes one file, whose name may have one subfolder before a slash; may be called from several threads. A failure shows at
    /// <see cref="Commit"/>.
    /// </summary>
    public void Write(string name, Action<Stream> write)
    {
        try
        {
            _staging.Write(name, write);
        }
        catch (Exception exception) when (exception is IOException or UnauthorizedAccessException)
        {
            Interlocked.CompareExchange(ref _failure, exception, null);
        }
    }

    /// <summary>Puts the new files in place of the old ones.</summary>
    /// <returns>Names of the files written, sorted; null after an error in <paramref name="diagnostics"/>.</returns>
    public IReadOnlyList<string>? Commit(DiagnosticBag diagnostics)
    {
        if (_failure is { } failure)
        {
            SayCannotWrite(_target, failure, diagnostics);
            return null;
        }

        try
        {
            string[] names = _staging.Seal();
            string[] foreign = Directory.Exists(_target) ? FolderManifest.ForeignEntriesIn(_target) : [];
            string[] inTheWay = [.. foreign.Intersect(names)];
            if (inTheWay.Length > 0)
            {
                SayForeign(inTheWay, diagnostics);
                return null;
            }

            PutInPlace(names, foreign);
            return names;
        }
        catch (Exception exception) when (exception is IOException or UnauthorizedAccessException)
        {
            SayCannotWrite(_target, exception, diagnostics);
            return null;
        }
    }

    /// <summary>Removes what an unfinished run has written.</summary>
    public void Dispose() => _staging.Dispose();

    private static void SayCannotWrite(string path, Exception exception, DiagnosticBag diagnostics) => diagnostics.Error(
        ReportCodes.CannotWrite,
        $"results cannot be written to `{path}`",
        help: "choose another folder with `-o`",
        notes: exception.Message);

    private void SayForeign(string[] inTheWay, DiagnosticBag diagnostics) => diagnostics.Error(
        ReportCodes.ForeignFile,
        $"`{_target}` holds {string.Join(", ", inTheWay.Select(name => $"`{name}`"))}, which Boltup did not write",
        help: "choose another folder with `-o`, or move the file away");

    private void PutInPlace(string[] names, string[] foreign)
    {
        if (!Directory.Exists(_target))
        {
            _staging.Release();
            Directory.Move(_staging.FullPath, _target);
            File.Delete(Path.Combine(_target, FolderManifest.Journal));
        }
        else if (_staging.IsBeside && foreign.Length == 0 && FolderExchange.TryExchange(_staging.FullPath, _target))
        {
            File.Delete(Path.Combine(_target, FolderManifest.Journal));
            GiveBackLateComers();
        }
        else
        {
            new FileReplacement(_staging, _target).Run(names);
        }
    }

    /// <summary>Files of others that came between the look into the folder and its exchange belong into the new one.</summary>
    private void GiveBackLateComers()
    {
        foreach (string name in FolderManifest.ForeignEntriesIn(_staging.FullPath))
        {
            string home = Path.Combine(_target, name);
            Directory.CreateDirectory(Path.GetDirectoryName(home)!);
            Directory.Move(Path.Combine(_staging.FullPath, name), home);
        }
    }
}
