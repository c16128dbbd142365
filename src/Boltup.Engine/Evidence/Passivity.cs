using Boltup.Engine.Spectra;

namespace Boltup.Engine.Evidence;

/// <summary>Whether FRFs between dofs that were measured both ways can belong to a structure without an own source.</summary>
/// <param name="Dofs">Number of dofs that were measured both ways.</param>
/// <param name="SmallestEigenvalue">
/// Per line: smallest eigenvalue of the Hermitian part of the mobility, each dof scaled by the root of its own |mobility|: the least power
/// that any forces put in, as a share of apparent power. Not negative for a passive structure. Empty without such dofs.
/// </param>
public sealed record Passivity(FrequencyAxis Axis, int Dofs, IReadOnlyList<double> SmallestEigenvalue);
