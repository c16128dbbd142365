using Boltup.Engine.Spectra;

namespace Boltup.Engine.Coupling;

/// <summary>What the coupled assembly does under some columns of forces.</summary>
/// <param name="JointForces">λ: constraints × columns, N and N·m.</param>
/// <param name="Responses">For each part its responses × columns, m, rad or Pa; null for a part that has none.</param>
/// <param name="Condition">1-norm condition number estimate of the interface problem per line.</param>
internal sealed record CouplingSolution(TiledMatrix JointForces, IReadOnlyList<TiledMatrix?> Responses, double[] Condition);
