namespace Boltup.Tests.Reports;

/// <summary>A folder that is gone after the test.</summary>
internal sealed class TemporaryFolder : IDisposable
{
    public string Root { get; } = Directory.CreateTempSubdirectory("boltup-test-").FullName;

    public string this[string name] => Path.Combine(Root, name);

    public string Read(string name) => File.ReadAllText(this[name]);

    public void Dispose() => Directory.Delete(Root, recursive: true);
}
