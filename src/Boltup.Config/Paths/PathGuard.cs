using Boltup.Config.Binding;
using Boltup.Config.Documents;
using Boltup.Engine.Diagnostics;

namespace Boltup.Config.Paths;

/// <summary>Says whether a file may be read: inside the tree, there, a file, and not absurdly large.</summary>
internal sealed class PathGuard
{
    /// <summary>Most names of a folder among which a similar one is looked for.</summary>
    private const int MaximumListed = 10_000;

    private readonly LoadOptions _options;
    private readonly string _root;

    /// <param name="topPath">Absolute path of the document that was asked for.</param>
    public PathGuard(string topPath, LoadOptions options)
    {
        _options = options;
        _root = RealPath.Of(RootOf(Path.GetDirectoryName(topPath) ?? topPath));
    }

    /// <summary>Checks a data file that a document names.</summary>
    public bool CheckData(FileReference file, DiagnosticBag diagnostics) =>
        IsReadable(file.FullPath, file, _options.MaximumDataBytes, diagnostics);

    /// <summary>Checks a file; when nobody named it, it is the one that the user asked for and may be anywhere.</summary>
    public bool IsReadable(string fullPath, FileReference? named, long maximumBytes, DiagnosticBag diagnostics)
    {
        SourceSpan span = named?.Span ?? new SourceSpan(DisplayPath.Of(fullPath, _options.WorkingDirectory));
        string shown = named?.Written ?? span.File;
        if (named is not null && !_options.AllowOutsidePaths && !IsInside(fullPath))
        {
            diagnostics.Error(ConfigCodes.OutsidePath, $"`{shown}` leads out of `{DisplayPath.Of(_root, _options.WorkingDirectory)}`", span,
                "keep the data inside, or allow it with `--allow-outside`");
            return false;
        }

        return IsSensibleFile(fullPath, shown, span, maximumBytes, diagnostics);
    }

    private bool IsSensibleFile(string fullPath, string shown, SourceSpan span, long maximumBytes, DiagnosticBag diagnostics)
    {
        var file = new FileInfo(RealPath.Of(fullPath));
        if (file.LinkTarget is not null)
        {
            diagnostics.Error(ConfigCodes.UnreadableFile, $"`{shown}` is a symbolic link that leads in a circle", span);
            return false;
        }

        if (!file.Exists)
        {
            Missing(fullPath, shown, span, diagnostics);
            return false;
        }

        if (file.Length > maximumBytes)
        {
            diagnostics.Error(ConfigCodes.FileTooLarge,
                $"`{shown}` has {file.Length} bytes, more than the {maximumBytes} that are read", span);
            return false;
        }

        return true;
    }

    private bool IsInside(string fullPath)
    {
        string real = RealPath.Of(fullPath);
        string root = _root.EndsWith(Path.DirectorySeparatorChar) ? _root : _root + Path.DirectorySeparatorChar;
        return real.StartsWith(root, StringComparison.Ordinal);
    }

    private void Missing(string fullPath, string shown, SourceSpan span, DiagnosticBag diagnostics)
    {
        if (Directory.Exists(fullPath))
        {
            diagnostics.Error(ConfigCodes.UnreadableFile, $"`{shown}` is a folder, expected a file", span);
            return;
        }

        string folder = Path.GetDirectoryName(fullPath) ?? fullPath;
        if (!Directory.Exists(folder))
        {
            diagnostics.Error(ConfigCodes.MissingFile, $"file `{shown}` not found", span, Separators(shown),
                $"there is no folder `{DisplayPath.Of(folder, _options.WorkingDirectory)}`");
            return;
        }

        string? near = NearestName.Of(Path.GetFileName(fullPath), NamesIn(folder));
        string? help = near is null ? Separators(shown) : $"did you mean `{Beside(shown, near)}`?";
        diagnostics.Error(ConfigCodes.MissingFile, $"file `{shown}` not found", span, help,
            $"looked in `{DisplayPath.Of(folder, _options.WorkingDirectory)}`");
    }

    private static string? Separators(string shown) =>
        shown.Contains('\\', StringComparison.Ordinal) ? $"write `{shown.Replace('\\', '/')}`" : null;

    private static string Beside(string shown, string name)
    {
        int slash = shown.LastIndexOf('/');
        return slash < 0 ? name : shown[..(slash + 1)] + name;
    }

    private static string[] NamesIn(string folder)
    {
        try
        {
            IEnumerable<string> paths = Directory.EnumerateFiles(folder).Take(MaximumListed);
            return [.. paths.Select(path => Path.GetFileName(path)).Order(StringComparer.Ordinal)];
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException)
        {
            return [];
        }
    }

    /// <summary>The nearest folder upwards that is a repository, otherwise the folder itself.</summary>
    private static string RootOf(string folder)
    {
        for (string? at = folder; at is not null; at = Path.GetDirectoryName(at))
        {
            string mark = Path.Combine(at, ".git");
            if (Directory.Exists(mark) || File.Exists(mark))
            {
                return at;
            }
        }

        return folder;
    }
}
