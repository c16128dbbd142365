namespace Boltup.Engine.Paths;

/// <summary>
/// A limit on the power of a response: Σ factor·mean square ≤ power. An overall limit is one of them over all its lines, a third-octave curve one per
/// band, a narrow-band curve one per line; a frequency weighting goes into the factors.
/// </summary>
/// <param name="Lines">Factors on the lines of the operation.</param>
/// <param name="Power">Largest mean square, in the unit of the response squared.</param>
public sealed record PathLimit(LineWeights Lines, double Power);
