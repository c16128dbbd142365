using Boltup.Engine.Diagnostics;
using Boltup.Reports.Results;

namespace Boltup.Tests.Reports;

/// <summary>A folder of its own for a test that writes results; gone at the end.</summary>
internal sealed class ResultsSandbox : IDisposable
{
    public DirectoryInfo Root { get; } = Directory.CreateTempSubdirectory("boltup-results-");

    public DiagnosticBag Diagnostics { get; } = new();

    /// <summary>The folder of results.</summary>
    public string Target => Path.Combine(Root.FullName, "out");

    public string[] EntriesOfRoot => [.. Root.EnumerateFileSystemInfos().Select(entry => entry.Name).Order(StringComparer.Ordinal)];

    public string Read(string name) => File.ReadAllText(Path.Combine(Target, name));

    public void Place(string name, string text)
    {
        string path = Path.Combine(Target, name);
        Directory.CreateDirectory(Path.GetDirectoryName(path)!);
        File.WriteAllText(path, text);
    }

    /// <summary>Runs to the end, every file with the same text.</summary>
    public IReadOnlyList<string>? Run(string text, params string[] names) => Run(Target, text, names);

    public IReadOnlyList<string>? Run(string folder, string text, string[] names)
    {
        using OutputFolder? output = OutputFolder.Prepare(folder, Diagnostics);
        foreach (string name in names)
        {
            output!.Write(name, stream => stream.Write(System.Text.Encoding.UTF8.GetBytes(text)));
        }

        return output?.Commit(Diagnostics);
    }

    public void Dispose() => Root.Delete(recursive: true);
}
