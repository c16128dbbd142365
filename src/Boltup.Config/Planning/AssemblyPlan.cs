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

    internal AssemblyPlan(AssemblyModel assembly, IReadOnlyList<SourceFile> inputs, DataLibrary library) =>
        (Assembly, Inputs, _library) = (assembly, inputs, library);

    /// <summary>The assembly for the engine; its measured parts read their curves when they are evaluated.</summary>
    public AssemblyModel Assembly { get; }

    /// <summary>Every file that the result depends on, documents first.</summary>
    public IReadOnlyList<SourceFile> Inputs { get; }

    public void Dispose() => _library.Dispose();
}
