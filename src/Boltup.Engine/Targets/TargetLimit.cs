using Boltup.Engine.Acoustics;

namespace Boltup.Engine.Targets;

/// <summary>A limit in dB, of a third octave or of all that counts.</summary>
/// <param name="Band">The third octave; null for an overall limit.</param>
public sealed record TargetLimit(OctaveBand? Band, double Decibels);
