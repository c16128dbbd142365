namespace Boltup.Engine.Paths;

/// <summary>How much one path alone must drop for a response to keep its limits.</summary>
/// <param name="Decibels">
/// The smallest reduction of the contribution in dB, the same at all lines, that meets every limit; 0 where they are kept already, infinite where
/// the path must vanish altogether; null where no reduction of this path alone is enough.
/// </param>
public sealed record PathReduction(TransferPath Path, double? Decibels);
