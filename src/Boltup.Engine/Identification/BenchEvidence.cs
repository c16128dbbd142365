using Boltup.Engine.Evidence;

namespace Boltup.Engine.Identification;

/// <summary>What speaks for and against identified forces.</summary>
/// <param name="Validations">For each operation what was checked, the on-board check before the transfer.</param>
/// <param name="Stiffness">Whether contact forces measured on this bench could stand for blocked forces; null when it cannot be said.</param>
/// <param name="Routes">Forces found other ways.</param>
public sealed record BenchEvidence(
    IReadOnlyList<OperationValidation> Validations, BenchStiffness? Stiffness, IReadOnlyList<RouteResult> Routes)
{
    public static readonly BenchEvidence None = new([], null, []);
}
