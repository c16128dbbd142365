namespace Boltup.Engine.Parts;

/// <summary>What the FRFs between some dofs, measured both ways, say about the measurement. Figures only; nothing is judged.</summary>
/// <param name="Lines">Number of lines.</param>
/// <param name="DrivingPoints">One entry per dof that is both excited and measured.</param>
/// <param name="Pairs">One entry per pair of such dofs.</param>
public sealed record FrfQualityReport(
    int Lines, IReadOnlyList<DrivingPointPower> DrivingPoints, IReadOnlyList<ReciprocityPair> Pairs);
