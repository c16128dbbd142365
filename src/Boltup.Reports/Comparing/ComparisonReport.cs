using Boltup.Engine.Comparing;
using Boltup.Reports.Results;

namespace Boltup.Reports.Comparing;

/// <summary>Everything that a comparison says; text, Markdown, JSON and pictures are made from it.</summary>
/// <param name="BaseFile">Path of the base, as the user would type it.</param>
/// <param name="Differences">Inputs that differ.</param>
/// <param name="Effect">What they do; null where nothing differs that a result depends on, and so nothing was computed.</param>
/// <param name="ToleranceDb">By how much a level may rise.</param>
/// <param name="BaseInputs">Fingerprints of all inputs of the base.</param>
public sealed record ComparisonReport(
    string BaseFile,
    string ChangedFile,
    IReadOnlyList<InputDifference> Differences,
    ComparedPredictions? Effect,
    double ToleranceDb,
    IReadOnlyList<InputFingerprint> BaseInputs,
    IReadOnlyList<InputFingerprint> ChangedInputs,
    string ProgramVersion)
{
    /// <summary>The targets that were kept before and are missed now.</summary>
    public IReadOnlyList<TargetChange> Lost => [.. (Effect?.Targets ?? []).Where(target => target.IsLost)];

    /// <summary>Whether the change makes anything worse than it may.</summary>
    public bool IsWorse => Regressions.Count + Lost.Count > 0;

    /// <summary>The responses whose overall level rises by more than the tolerance, or is not known any more.</summary>
    public IReadOnlyList<ResponseChange> Regressions =>
        [.. (Effect?.Responses ?? []).Where(response => !(response.Overall.Decibels <= ToleranceDb)).OrderByDescending(response => response.Overall.Decibels)];
}
