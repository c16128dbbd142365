namespace Boltup.Engine.Acoustics;

/// <summary>
/// Daily exposure values of Directive 2002/44/EC, article 3, normalised to 8 hours. They are quoted, never judged: A(8) needs how long
/// people are exposed and all axes, which a prediction of one running condition does not know.
/// </summary>
/// <param name="ActionValue">In m/s², beyond which the employer must act.</param>
/// <param name="LimitValue">In m/s², never to be exceeded.</param>
public sealed record Exposure(string Of, double ActionValue, double LimitValue)
{
    public static readonly Exposure HandArm = new("hand-arm vibration", 2.5, 5);

    public static readonly Exposure WholeBody = new("whole-body vibration", 0.5, 1.15);

    /// <summary>The values that go with a weighting, or null for a weighting of sound.</summary>
    public static Exposure? For(FrequencyWeighting weighting) => !weighting.IsOfVibration() ? null : weighting == FrequencyWeighting.Wh ? HandArm : WholeBody;

    /// <summary>The values with the name of the directive and what they must not be taken for.</summary>
    public string Caution => FormattableString.Invariant(
        $"Directive 2002/44/EC, {Of}: action value {ActionValue} m/s², limit value {LimitValue} m/s², both A(8). A weighted value of one axis and one running condition is no A(8): exposure needs the other axes, the time of a day and a measurement by a competent person.");
}
