using Boltup.Engine.Prediction;
using Boltup.Engine.Targets;

namespace Boltup.Engine.Comparing;

/// <summary>What only one of two predictions has, and so cannot be compared.</summary>
internal static class MissingSides
{
    /// <summary>The response of the same name and quantity, or null.</summary>
    public static ResponseSpectrum? Partner(ResponseSpectrum response, OperationResult other) =>
        other.Responses.FirstOrDefault(candidate => candidate.Name == response.Name && candidate.Quantity == response.Quantity && candidate.Unit == response.Unit);

    /// <summary>In words, one for each operation or response.</summary>
    public static IReadOnlyList<string> Of(PredictionResult before, PredictionResult changed) =>
    [
        .. Operations(before, changed, "only the base has"),
        .. Operations(changed, before, "only the changed assembly has"),
        .. before.Operations.SelectMany(operation => Apart(operation, changed)),
        .. Responses(before, changed, "only the base has"),
        .. Responses(changed, before, "only the changed assembly has"),
        .. Targets(before, changed, "only the base has"),
        .. Targets(changed, before, "only the changed assembly has"),
    ];

    /// <summary>Whether both judge the same target in the same operation.</summary>
    public static bool AreSame(TargetVerdict one, TargetVerdict other) => one.Target.Name == other.Target.Name && one.Operation == other.Operation;

    private static IEnumerable<string> Targets(PredictionResult one, PredictionResult other, string words) =>
        one.Verdicts.Where(verdict => !other.Verdicts.Any(partner => AreSame(verdict, partner)))
            .Select(verdict => $"{words} target `{verdict.Target.Name}` in operation `{verdict.Operation}`");

    private static IEnumerable<string> Operations(PredictionResult one, PredictionResult other, string words) =>
        one.Operations.Where(operation => Find(operation, other) is null).Select(operation => $"{words} operation `{operation.Name}`");

    private static IEnumerable<string> Apart(OperationResult operation, PredictionResult other) =>
        Find(operation, other) is not { } partner || operation.Axis.Matches(partner.Axis) ? []
        : operation.Axis.SharedWith(partner.Axis) is { } lines
            ? [$"operation `{operation.Name}` is compared on the {lines.Count} lines that both sides have"]
            : [$"operation `{operation.Name}` has no frequency line on both sides"];

    /// <summary>Every operation of an assembly has all of its responses, so the first one speaks for them.</summary>
    private static IEnumerable<string> Responses(PredictionResult one, PredictionResult other, string words) =>
        one.Operations.Count == 0 || other.Operations.Count == 0
            ? []
            : one.Operations[0].Responses.Where(response => Partner(response, other.Operations[0]) is null)
                .Select(response => $"{words} response `{response.Name}` in {response.Unit}");

    private static OperationResult? Find(OperationResult operation, PredictionResult other) =>
        other.Operations.FirstOrDefault(candidate => candidate.Name == operation.Name);
}
