namespace Boltup.Engine.Sensitivity;

/// <summary>What the overall level of one response depends on: mounts, then FRF rows, then forces.</summary>
public sealed record ResponseSensitivities(string Response, IReadOnlyList<LevelSensitivity> Levels);
