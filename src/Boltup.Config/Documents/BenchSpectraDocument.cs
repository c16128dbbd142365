using Boltup.Config.Binding;
using Boltup.Engine.Identification;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;

namespace Boltup.Config.Documents;

/// <summary>What sensors measured in one operation.</summary>
/// <param name="Files">One file of spectra, several runs, or one file of auto and cross spectra.</param>
/// <param name="Phase">Phase reference of the runs; common for one file.</param>
/// <param name="IsCrossSpectra">Whether the file holds auto and cross spectra.</param>
/// <param name="Motion">What motion spectra are, when the document says so.</param>
public sealed record BenchSpectraDocument(
    Marked<string> Name,
    IReadOnlyList<FileReference> Files,
    PhaseReference Phase,
    bool IsCrossSpectra,
    Marked<Quantity>? Motion,
    Marked<Amplitude>? Amplitude);
