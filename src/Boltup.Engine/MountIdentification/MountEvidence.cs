using Boltup.Engine.Spectra;

namespace Boltup.Engine.MountIdentification;

/// <summary>How far an identified stiffness can be trusted. Each number is a median over the lines, which a few bad ones do not move.</summary>
/// <param name="NotReciprocal">Difference of the two transfer stiffnesses, first to second end and back, relative to their mean.</param>
/// <param name="OtherDirections">
/// Stiffness that couples the direction with the other directions of the same mount, relative to the direction's own. Of a mount without such
/// coupling it shows turned sensors and omitted rotations.
/// </param>
/// <param name="OtherMounts">
/// Stiffness from this mount's first end to the second ends of all others, relative to the mount's own. It is zero where the two structures
/// are joined by these mounts alone: what is left comes from another connection, from omitted dofs or from noise. NaN for a single mount.
/// </param>
/// <param name="OwnEndsAlone">
/// Change of the identified stiffness when only the dofs of this direction are measured and all the others are left out: how much omitted
/// dofs can matter in this installation. NaN where no others were measured.
/// </param>
public sealed record MountEvidence(
    Direction Direction, double NotReciprocal, double OtherDirections, double OtherMounts, double OwnEndsAlone);
