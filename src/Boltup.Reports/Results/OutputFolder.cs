using Boltup.Engine.Diagnostics;

namespace Boltup.Reports.Results;

/// <summary>
/// Replaces the results in a folder as a whole: everything is written beside it first, then both folders change places. A run that fails
/// or is killed leaves the earlier results as they were. Files that Boltup did not write are carried over.
/// </summary>
/// <remarks>A folder that cannot be renamed, a mount point or the working folder, has its files replaced one after the other.</remarks>
public sealed class OutputFolder : IDisposable
{
    private readonly string _shownPath;
    private readonly string _target;
    private readonly string _staging;
    private readonly SortedSet<string> _written = new(StringComparer.Ordinal);
    private readonly Lock _lock = new();
    private Exception? _failure;
    private bool _isDone;

    private OutputFolder(string shownPath, string target, string staging)
    {
        _shownPath = shownPath;
        _target = target;
        _staging = staging;
    }

    /// <summary>Prepares to replace a folder.</summary>
    /// <returns>The folder, or null after an error in <paramref name="diagnostics"/>.</returns>
    public static OutputFolder? Prepare(string path, DiagnosticBag diagnostics)
    {
        try
        {
            string target = Resolve(path);
            return new OutputFolder(path, target, CreateStaging(target));
        }
        catch (Exception exception) when (IsRefusal(exception))
        {
            SayCannotWrite(path, exception, diagnostics);
            return null;
        }
    }

    /// <summary>Writes one file; may be called from several threads. A refusal of the system is kept for <see cref="Commit"/>.</summary>
    public void Write(string name, Action<Stream> write)
    {
        lock (_lock)
        {
            if (!_written.Add(name))
            {
                throw new ArgumentException($"`{name}` is written twice", nameof(name));
            }
        }

        try
        {
            using FileStream stream = File.Create(Path.Combine(_staging, name));
            write(stream);
        }
        catch (Exception exception) when (IsRefusal(exception))
        {
            lock (_lock)
            {
                _failure ??= exception;
            }
        }
    }

    /// <summary>Puts the new files in place of the old ones.</summary>
    /// <returns>Names of the files written, sorted; null after an error in <paramref name="diagnostics"/>.</returns>
    public IReadOnlyList<string>? Commit(DiagnosticBag diagnostics)
    {
        try
        {
            if (_failure is not null)
            {
                SayCannotWrite(_shownPath, _failure, diagnostics);
                return null;
            }

            return IsInTheWay(diagnostics) ? null : Replace(diagnostics);
        }
        catch (Exception exception) when (IsRefusal(exception))
        {
            SayCannotWrite(_shownPath, exception, diagnostics);
            return null;
        }
    }

    /// <summary>Removes what an unfinished run has written.</summary>
    public void Dispose()
    {
        if (!_isDone && Directory.Exists(_staging))
        {
            ResultManifest.Delete(_staging, [.. _written, ResultManifest.FileName]);
        }
    }

    private static bool IsRefusal(Exception exception) => exception is IOException or UnauthorizedAccessException;

    /// <summary>The folder behind a link, so that the link stays one.</summary>
    private static string Resolve(string path)
    {
        var folder = new DirectoryInfo(Path.TrimEndingDirectorySeparator(Path.GetFullPath(path)));
        return folder.LinkTarget is null ? folder.FullName : folder.ResolveLinkTarget(returnFinalTarget: true)!.FullName;
    }

    /// <summary>A new folder beside the target, or inside it where the folder above is closed.</summary>
    private static string CreateStaging(string target)
    {
        try
        {
            return CreateNew($"{target}.boltup-{Environment.ProcessId}");
        }
        catch (UnauthorizedAccessException) when (Directory.Exists(target))
        {
            return CreateNew(Path.Combine(target, $".boltup-{Environment.ProcessId}"));
        }
    }

    /// <summary>What a killed run left behind may hold files of the user's: it is not touched.</summary>
    private static string CreateNew(string path)
    {
        string free = path;
        for (int i = 2; Path.Exists(free); i++)
        {
            free = FormattableString.Invariant($"{path}-{i}");
        }

        return Directory.CreateDirectory(free).FullName;
    }

    private static void SayCannotWrite(string path, Exception exception, DiagnosticBag diagnostics) => diagnostics.Error(
        ReportCodes.CannotWrite,
        $"results cannot be written to `{path}`",
        help: "choose another folder with `-o`",
        notes: exception.Message);

    private bool IsInTheWay(DiagnosticBag diagnostics)
    {
        HashSet<string> ours = Directory.Exists(_target) ? ResultManifest.Read(_target) : [];
        string[] foreign = [.. _written.Where(name => !ours.Contains(name) && Path.Exists(Path.Combine(_target, name)))];
        if (foreign.Length > 0)
        {
            diagnostics.Error(
                ReportCodes.ForeignFile,
                $"`{_shownPath}` holds {string.Join(", ", foreign.Select(name => $"`{name}`"))}, which Boltup did not write",
                help: "choose another folder with `-o`, or move the file away");
        }

        return foreign.Length > 0;
    }

    private List<string> Replace(DiagnosticBag diagnostics)
    {
        List<string> written = [.. _written];
        ResultManifest.Write(_staging, written);
        IReadOnlyList<string> left = FolderReplacement.Apply(_staging, _target, written);
        _isDone = true;
        if (left.Count > 0)
        {
            diagnostics.Warning(
                ReportCodes.LeftBehind,
                $"{string.Join(", ", left.Select(name => $"`{name}`"))} of `{_shownPath}` could not be carried over",
                help: $"move what you need back from `{_staging}`");
        }

        return written;
    }
}
