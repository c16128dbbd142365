using Boltup.Config.Documents;
using Boltup.Engine.Diagnostics;

namespace Boltup.Config;

/// <summary>Loads documents from files: syntax, then schema, then references, then whether the files are there.</summary>
/// <remarks>All errors of a phase are reported; a later phase only runs when the earlier ones of the same document found none.</remarks>
public static class ConfigLoader
{
    /// <summary>Loads a part file.</summary>
    public static LoadResult<PartDocument> LoadPart(string path, LoadOptions options, DiagnosticBag diagnostics)
    {
        var load = new DocumentLoad(path, options);
        PartDocument? part = load.Part(diagnostics);
        return new LoadResult<PartDocument>(part, load.FilesRead);
    }

    /// <summary>Loads an assembly file with its bases and its parts.</summary>
    public static LoadResult<AssemblyDocument> LoadAssembly(string path, LoadOptions options, DiagnosticBag diagnostics)
    {
        var load = new DocumentLoad(path, options);
        AssemblyDocument? assembly = load.Assembly(diagnostics);
        return new LoadResult<AssemblyDocument>(assembly, load.FilesRead);
    }

    /// <summary>Loads a bench file.</summary>
    public static LoadResult<BenchDocument> LoadBench(string path, LoadOptions options, DiagnosticBag diagnostics)
    {
        var load = new DocumentLoad(path, options);
        BenchDocument? bench = load.Bench(diagnostics);
        return new LoadResult<BenchDocument>(bench, load.FilesRead);
    }

    /// <summary>Loads a handover of blocked forces.</summary>
    public static LoadResult<ForcesDocument> LoadForces(string path, LoadOptions options, DiagnosticBag diagnostics)
    {
        var load = new DocumentLoad(path, options);
        ForcesDocument? forces = load.Forces(diagnostics);
        return new LoadResult<ForcesDocument>(forces, load.FilesRead);
    }

    /// <summary>Loads the pins of an assembly; the files that they name need not be there.</summary>
    public static LoadResult<PinsDocument> LoadPins(string path, LoadOptions options, DiagnosticBag diagnostics)
    {
        var load = new DocumentLoad(path, options);
        PinsDocument? pins = load.Pins(diagnostics);
        return new LoadResult<PinsDocument>(pins, load.FilesRead);
    }

    /// <summary>The kind of a document by its first key, or null with a diagnostic when it has none that this version reads.</summary>
    public static DocumentKind? KindOf(string path, LoadOptions options, DiagnosticBag diagnostics) =>
        new DocumentLoad(path, options).Kind(diagnostics);
}
