using Boltup.Engine.Evidence;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Identification;

/// <summary>Forces of one operation found another way.</summary>
/// <param name="Forces">As the source acts on the receiver; contact forces are named by the dofs of the interface where they belong to one.</param>
/// <param name="Comparison">Level of each dof against the in-situ blocked force; empty where the dofs have no counterpart.</param>
public sealed record RouteResult(string Name, string Operation, RouteForces Forces, BenchStiffness? Comparison);
