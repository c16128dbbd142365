using Boltup.Engine.Evidence;

namespace Boltup.Engine.Identification;

/// <summary>One check of one operation.</summary>
/// <param name="Installation">Title of the other installation; null on board.</param>
public sealed record OperationValidation(string Operation, string? Installation, ValidationReport Report);
