using Boltup.Config.Documents;
using Boltup.Config.Yaml;
using Boltup.Engine.Prediction;

namespace Boltup.Config.Planning;

/// <summary>
/// An assembly with every name resolved, every data file opened and every axis agreed, but nothing computed. Holds the data files open
/// until it is disposed.
/// </summary>
public sealed class AssemblyPlan : IDisposable
{
    private readonly DataLibrary _library;

    internal AssemblyPlan(AssemblyDocument document, AssemblyModel assembly, IReadOnlyList<SourceFile> documents, DataLibrary library)
    {
        (Document, Assembly, _library) = (document, assembly, library);
        DataFiles = [.. library.Files];
        Inputs = [.. documents, .. DataFiles];
    }

    /// <summary>The documents that the plan was made from.</summary>
    public AssemblyDocument Document { get; }

    /// <summary>The assembly for the engine; its measured parts read their curves when they are evaluated.</summary>
    public AssemblyModel Assembly { get; }

    /// <summary>Every file that the result depends on, documents first.</summary>
    public IReadOnlyList<SourceFile> Inputs { get; }

    /// <summary>The inputs that are no documents.</summary>
    public IReadOnlyList<SourceFile> DataFiles { get; }

    public void Dispose() => _library.Dispose();
}
