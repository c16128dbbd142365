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
}
