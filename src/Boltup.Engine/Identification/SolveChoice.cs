namespace Boltup.Engine.Identification;

/// <summary>What the bench asks of the inversion.</summary>
/// <param name="Threshold">Truncated: share of the largest singular value below which a value is left out; null takes the noise of the FRFs.</param>
/// <param name="Damping">Tikhonov with <see cref="DampingRule.Fixed"/>: λ as a share of the largest singular value.</param>
public sealed record SolveChoice(SolveMethod Method, double? Threshold = null, DampingRule Rule = DampingRule.Fixed, double Damping = 0)
{
    public static readonly SolveChoice Plain = new(SolveMethod.LeastSquares);

    /// <summary>Whether singular values are cut where the noise of the FRFs hides them.</summary>
    public bool UsesNoise => Method == SolveMethod.Truncated && Threshold is null;
}
