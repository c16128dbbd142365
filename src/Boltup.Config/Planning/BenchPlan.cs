using Boltup.Config.Documents;
using Boltup.Config.Yaml;
using Boltup.Engine.Identification;

namespace Boltup.Config.Planning;

/// <summary>
/// A bench with every name resolved, every data file opened and every axis agreed, but nothing identified. Holds the data files open until
/// it is disposed.
/// </summary>
public sealed class BenchPlan : IDisposable
{
    private readonly DataLibrary _library;

    internal BenchPlan(
        BenchDocument document, BenchModel bench, BenchExtras extras, IReadOnlyList<SourceFile> inputs, DataLibrary library) =>
        (Document, Bench, Extras, Inputs, _library) = (document, bench, extras, inputs, library);

    /// <summary>What the user wrote.</summary>
    public BenchDocument Document { get; }

    public BenchModel Bench { get; }

    /// <summary>What the evidence is drawn from beyond the bench itself.</summary>
    public BenchExtras Extras { get; }

    /// <summary>Every file that the result depends on, documents first.</summary>
    public IReadOnlyList<SourceFile> Inputs { get; }

    public void Dispose()
    {
        Extras.Dispose();
        _library.Dispose();
    }
}
