using Boltup.Engine.Parts;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Identification;

/// <summary>The same source on another receiver: the stronger check of blocked forces.</summary>
/// <param name="Installed">FRFs of that installation at rest, from the same interface dofs to its sensors.</param>
/// <param name="Sensors">The dofs whose spectra are predicted.</param>
/// <param name="Measured">What they measured, by the names of the bench's operations, as the engine holds motion.</param>
public sealed record SecondInstallation(
    string Title, IPartModel Installed, IReadOnlyList<Dof> Sensors, IReadOnlyList<(string Operation, SpectrumSet Spectra)> Measured);
