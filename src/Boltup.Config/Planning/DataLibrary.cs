using Boltup.Config.Documents;
using Boltup.Config.Paths;
using Boltup.Config.Yaml;
using Boltup.Engine.Diagnostics;
using Boltup.Files;

namespace Boltup.Config.Planning;

/// <summary>Opens every data file of a run once.</summary>
internal sealed class DataLibrary(LoadOptions options, DiagnosticBag diagnostics) : IDisposable
{
    private readonly Dictionary<string, DataFile?> _files = new(StringComparer.Ordinal);

    /// <summary>The files that were opened, in order.</summary>
    public IEnumerable<SourceFile> Files => _files.Where(file => file.Value is not null).Select(file => new SourceFile(file.Key, file.Value!.DisplayPath));

    /// <summary>The file, or null after an error that has been said.</summary>
    public DataFile? Open(FileReference reference)
    {
        if (!_files.TryGetValue(reference.FullPath, out DataFile? file))
        {
            file = DataFile.Open(
                reference.FullPath, DisplayPath.Of(reference.FullPath, options.WorkingDirectory), diagnostics);
            _files.Add(reference.FullPath, file);
        }

        return file;
    }

    public void Dispose()
    {
        foreach (DataFile? file in _files.Values)
        {
            file?.Dispose();
        }
    }
}
