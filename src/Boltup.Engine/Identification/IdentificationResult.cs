using Boltup.Engine.Diagnostics;
using Boltup.Engine.Evidence;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Identification;

/// <summary>Everything that one identification found; immutable, and all that the writers see.</summary>
/// <param name="Title">Title of the bench.</param>
/// <param name="Axis">The lines of all spectra.</param>
/// <param name="Interface">Where the blocked forces act.</param>
/// <param name="Operations">One entry per operation, in the order of the bench file.</param>
/// <param name="SingularValues">Of the indicator FRFs.</param>
/// <param name="Coherence">Coherence of the installed FRFs; null when the bench gives none.</param>
/// <param name="Quality">What else the data say of themselves.</param>
/// <param name="Kernels">Name of the batch kernels that ran.</param>
/// <param name="Diagnostics">Notes and warnings of the run.</param>
public sealed record IdentificationResult(
    string Title,
    FrequencyAxis Axis,
    IReadOnlyList<Dof> Interface,
    IReadOnlyList<Dof> Indicators,
    IReadOnlyList<Dof> Validation,
    SolveChoice Solve,
    IReadOnlyList<IdentifiedOperation> Operations,
    SingularSpectrum SingularValues,
    CoherenceReport? Coherence,
    BenchQuality Quality,
    string Kernels,
    IReadOnlyList<Diagnostic> Diagnostics);
