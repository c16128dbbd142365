namespace Boltup.Engine.Paths;

/// <summary>What one path does to a response in a band.</summary>
/// <param name="Power">Mean square of its contribution alone, in the unit of the response squared.</param>
/// <param name="Share">
/// The part of the response's power that it brings in, Σ Re(c u*)/Σ|u|²: the shares of all paths sum to 1. Negative: it works against the
/// response, which would grow without it.
/// </param>
/// <param name="HalvedChange">What the level of the response would change by, in dB, were this contribution alone 6 dB lower (halved).</param>
public sealed record RankedPath(TransferPath Path, double Power, double Share, double HalvedChange);
