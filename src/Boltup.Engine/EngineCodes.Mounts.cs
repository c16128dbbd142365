using Boltup.Engine.Diagnostics;

namespace Boltup.Engine;

/// <summary>Laws of mounts.</summary>
public static partial class EngineCodes
{
    public static readonly DiagnosticCode MountGivesPower = new(
        "ENG120",
        "a mount gives power",
        "A mount dissipates: with the time factor e^{+jωt} the imaginary part of its stiffness is not negative, and for a matrix the imaginary (anti-Hermitian) part has no negative eigenvalue. A law that breaks this feeds power into the assembly and can hide resonances or invent them.",
        "a table measured with the other sign of time, so that every imaginary part is negative",
        "Check the sign convention of the measurement; near zero loss, smooth or average the table.");

    public static readonly DiagnosticCode ConstantLossFactor = new(
        "ENG121",
        "a constant loss factor is used over decades of frequency",
        "No causal material has a loss factor that stays constant while its stiffness stays constant too: by the local form of the Kramers–Kronig relations (O'Donnell, Jaynes, Miller, J. Acoust. Soc. Am. 69 (1981) 696; from memory) the stiffness rises by the power 2η/π of the frequency ratio. Over a narrow band that does not matter; over decades the constant law is too soft at its upper end, or too stiff at its lower one.",
        "mounts: { base: { stiffness: { z: 345 N/mm }, loss_factor: 0.12 } }  # from 20 Hz to 2 kHz",
        "Nothing to do for a first estimate. Otherwise give the static stiffness with `relaxation`, or a measured `table`.");

    public static readonly DiagnosticCode NoMassEffect = new(
        "ENG122",
        "a mount with two ends that has no mass effect",
        "Where k11, k22, −k12 and −k21 are the same, the mount passes on the force that it receives, and the 2×2 stiffness of its two ends cannot be inverted.",
        "a table with the column `term` in which all four terms of a direction have the same size",
        "Give k21 with its sign turned as a plain table, without the column `term`.");

    public static readonly DiagnosticCode MountsLeak = new(
        "ENG123",
        "mounts that are not the only connection of two structures",
        "Between the first end of one mount and the second end of another there is no element, so the inverse of the installed FRFs is zero there. Where it is not, the two structures are joined somewhere else too, dofs of the ends were left out, or the FRFs are not good enough to be inverted. The identified stiffness carries an error of about that size.",
        "four mounts of which two were measured",
        "Measure both ends of every mount and connection, with rotations where they matter.");

    public static readonly DiagnosticCode RotationsOmitted = new(
        "ENG124",
        "rotations at the ends of mounts are left out",
        "Inverse substructuring treats dofs that were not measured as free of force. Rotations nearly always are such dofs: where a mount resists rotation, or its ends lie beside the point of measurement, the identified stiffness is biased by what the rotations do.",
        "one sensor with three axes at each end of a mount",
        "Nothing to do for soft mounts whose ends hardly turn. Otherwise describe each end by six dofs, from at least three sensors.");
}
