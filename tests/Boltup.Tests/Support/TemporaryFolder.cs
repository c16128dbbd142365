namespace Boltup.Tests.Support;

/// <summary>A folder that goes away with the test.</summary>
internal sealed class TemporaryFolder : IDisposable
{
    public string Path { get; } = Directory.CreateTempSubdirectory("boltup-test-").FullName;

    public string PathTo(params string[] parts) => System.IO.Path.Combine([Path, .. parts]);

    /// <summary>Writes a text file, and the folders above it.</summary>
    public string Write(string name, string text)
    {
        string path = PathTo(name);
        Directory.CreateDirectory(System.IO.Path.GetDirectoryName(path)!);
        File.WriteAllText(path, text);
        return path;
    }

    public void Dispose() => Directory.Delete(Path, recursive: true);
}
