using Boltup.Engine.Spectra;

namespace Boltup.Engine.VirtualPoints;

/// <summary>How well the channels around a virtual point move, or load it, as a rigid piece.</summary>
/// <param name="Point">Name of the point.</param>
/// <param name="OfImpacts">Whether the impacts are judged; otherwise the sensors.</param>
/// <param name="Axis">The lines of <paramref name="PerLine"/>.</param>
/// <param name="PerLine">1 − Σ|u − û|²/Σ|u|² over all channels and FRFs at each line: 1 for a rigid piece.</param>
/// <param name="Channels">
/// Each channel with its consistency over all lines, Σ|u + û|²/(2Σ(|u|² + |û|²)): 1 where the rigid motion explains it, 1/2 where it is
/// unrelated, 0 where it is flipped (van der Seijs and others 2013).
/// </param>
/// <param name="Condition">Condition number of the rigid relation, rotations scaled.</param>
/// <param name="IsExactlyDetermined">Whether the fit is perfect by construction, so that the figures say nothing.</param>
public sealed record VirtualPointQuality(
    string Point,
    bool OfImpacts,
    FrequencyAxis Axis,
    IReadOnlyList<double> PerLine,
    IReadOnlyList<(Dof Dof, double Consistency)> Channels,
    double Condition,
    bool IsExactlyDetermined)
{
    /// <summary>The channel that disagrees most with the others; null when none is checked by the others.</summary>
    public OddChannel? Odd { get; init; }

    /// <summary>Mean of <see cref="PerLine"/>.</summary>
    public double Overall => PerLine.Average();
}
