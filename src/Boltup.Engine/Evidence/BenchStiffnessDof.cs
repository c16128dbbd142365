using System.Numerics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Evidence;

/// <summary>How the contact force at one dof compares with the blocked force.</summary>
/// <param name="RatioDb">Per line: 20 lg |contact|/|blocked|.</param>
/// <param name="MobilityRatio">
/// Per line Y_S/Y_R as felt at this dof, T/(1 − T) of its own entry of T: exact for one dof, with the other dofs coupled otherwise. Large:
/// the bench is a force sink and the contact force is the blocked force; small: a velocity source; near −1: source and bench resonate
/// together and errors blow up. Empty where only forces are known.
/// </param>
/// <param name="StrongCoupling">Bands where <paramref name="MobilityRatio"/> is within 0.5 of −1: what source and bench yield together is at most half of what the bench yields alone.</param>
/// <param name="Agreement">Up to where <paramref name="RatioDb"/> stays within each limit.</param>
public sealed record BenchStiffnessDof(
    Dof Dof,
    IReadOnlyList<double> RatioDb,
    IReadOnlyList<Complex> MobilityRatio,
    IReadOnlyList<LineBand> StrongCoupling,
    IReadOnlyList<AgreementLimit> Agreement);
