using Boltup.Engine.Evidence;
using Boltup.Engine.Parts;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Identification;

/// <summary>What was measured to find interface forces another way.</summary>
/// <param name="Measured">By the names of the bench's operations: contact forces, free motion, or motion of both ends of the mounts.</param>
/// <param name="FreeSource">FRFs of the source hung free, for the free-velocity route.</param>
/// <param name="Mounts">The mounts of the bench, for the mount-stiffness method.</param>
public sealed record RouteMeasurement(
    string Name,
    ForceRoute Route,
    IReadOnlyList<(string Operation, SpectrumSet Spectra)> Measured,
    IPartModel? FreeSource,
    IReadOnlyList<MountPath> Mounts);
