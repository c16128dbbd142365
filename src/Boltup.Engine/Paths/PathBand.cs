namespace Boltup.Engine.Paths;

/// <summary>A band in which paths are ranked.</summary>
/// <param name="CentreHz">Exact mid-band frequency of a third octave; null for all lines together.</param>
public sealed record PathBand(double? CentreHz, LineWeights Weights);
