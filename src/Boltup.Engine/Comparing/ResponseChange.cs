using Boltup.Engine.Spectra;

namespace Boltup.Engine.Comparing;

/// <summary>What a change does to one response in one operation.</summary>
/// <param name="Unit">SI unit of the response.</param>
/// <param name="Lines">The lines that both sides have; levels are sums over them.</param>
/// <param name="Overall">Over all of them.</param>
/// <param name="Bands">Per third octave, upwards.</param>
/// <param name="Paths">By joint, the one whose power changed most first; empty where nothing is joined.</param>
/// <param name="Causes">What each edit does to first order, the largest first.</param>
public sealed record ResponseChange(
    string Operation,
    string Response,
    Quantity Quantity,
    string Unit,
    FrequencyAxis Lines,
    LevelChange Overall,
    IReadOnlyList<BandChange> Bands,
    IReadOnlyList<PathChange> Paths,
    IReadOnlyList<AttributedChange> Causes)
{
    /// <summary>Sum over the edits of what each would do to first order, in dB.</summary>
    public double LinearDecibels => Causes.Sum(cause => cause.Decibels);
}
