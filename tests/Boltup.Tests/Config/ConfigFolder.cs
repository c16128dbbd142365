using Boltup.Config;
using Boltup.Config.Documents;
using Boltup.Engine.Diagnostics;

namespace Boltup.Tests.Config;

/// <summary>A temporary folder with documents in it, seen as the working directory of a user.</summary>
internal sealed class ConfigFolder : IDisposable
{
    public string Root { get; } = Directory.CreateTempSubdirectory("boltup-config-").FullName;

    public DiagnosticBag Diagnostics { get; } = new();

    public LoadOptions Options { get; set; } = new();

    public ConfigFolder With(string name, string content)
    {
        string path = Path.Combine(Root, name);
        Directory.CreateDirectory(Path.GetDirectoryName(path)!);
        File.WriteAllText(path, content);
        return this;
    }

    public ConfigFolder With(string name, byte[] content)
    {
        File.WriteAllBytes(Path.Combine(Root, name), content);
        return this;
    }

    public LoadResult<PartDocument> LoadPart(string name = "a.part.yaml") =>
        ConfigLoader.LoadPart(name, Options with { WorkingDirectory = Root }, Diagnostics);

    public LoadResult<AssemblyDocument> LoadAssembly(string name = "a.assembly.yaml") =>
        ConfigLoader.LoadAssembly(name, Options with { WorkingDirectory = Root }, Diagnostics);

    /// <summary>Loads a document by the kind that its file name says.</summary>
    public object? Load(string name) => name.Split('.')[^2] switch
    {
        "part" => LoadPart(name).Document,
        "bench" => ConfigLoader.LoadBench(name, Options with { WorkingDirectory = Root }, Diagnostics).Document,
        "forces" => ConfigLoader.LoadForces(name, Options with { WorkingDirectory = Root }, Diagnostics).Document,
        "pins" => ConfigLoader.LoadPins(name, Options with { WorkingDirectory = Root }, Diagnostics).Document,
        _ => LoadAssembly(name).Document,
    };

    public void Dispose() => Directory.Delete(Root, recursive: true);
}
