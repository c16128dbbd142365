namespace Boltup.Engine.Evidence;

/// <summary>Whether the channels of an operation go with the installed FRFs.</summary>
/// <param name="Suspects">Channels that do not, strongest evidence first.</param>
/// <param name="Misfit">Relative residual of the least squares over all channels as measured: ‖u − Y Y⁺u‖/‖u‖, every line of equal weight.</param>
/// <param name="CorrectedMisfit">The same with the suspects corrected, or left out where no factor fits.</param>
/// <param name="Lines">Number of lines that were looked at.</param>
public sealed record ChannelReport(IReadOnlyList<ChannelSuspect> Suspects, double Misfit, double CorrectedMisfit, int Lines);
