namespace Boltup.Engine.Paths;

/// <summary>Two contributions that cancel each other in a band.</summary>
/// <param name="Cancelled">
/// −2 Σ Re(c d*) over Σ of the powers of all paths, above zero: the share of the power that all paths would give without common phase which this pair
/// takes away.
/// </param>
public sealed record PathPair(TransferPath First, TransferPath Second, double Cancelled);
