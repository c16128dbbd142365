namespace Boltup.Engine.Sensitivity;

/// <summary>What a small change does to the overall level of a response.</summary>
/// <param name="Decibels">
/// Derivative of the level: dB per percent of a stiffness or loss factor, dB per dB of a force or FRF row. NaN for a response that is zero.
/// </param>
public sealed record LevelSensitivity(SensitivityParameter Parameter, double Decibels);
