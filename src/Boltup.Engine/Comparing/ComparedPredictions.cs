using Boltup.Engine.Prediction;

namespace Boltup.Engine.Comparing;

/// <summary>Two predictions and what became of the responses that both have.</summary>
/// <param name="Responses">Operation by operation, in the order of the base.</param>
/// <param name="Targets">The targets that both have, in every operation that both are judged in.</param>
/// <param name="NotCompared">What only one side has, in words.</param>
/// <param name="NotAttributed">Edits that have no first-order effect that could be told, such as a joint that was added, in words.</param>
public sealed record ComparedPredictions(
    PredictionResult Base,
    PredictionResult Changed,
    IReadOnlyList<ResponseChange> Responses,
    IReadOnlyList<TargetChange> Targets,
    IReadOnlyList<string> NotCompared,
    IReadOnlyList<string> NotAttributed);
