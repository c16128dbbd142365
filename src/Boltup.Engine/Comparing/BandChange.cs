using Boltup.Engine.Acoustics;

namespace Boltup.Engine.Comparing;

/// <summary>What changed in a third octave.</summary>
public sealed record BandChange(OctaveBand Band, LevelChange Level);
