using Boltup.Engine.Diagnostics;

namespace Boltup.Engine;

/// <summary>What is wrong or doubtful about measurements on a bench.</summary>
public static partial class EngineCodes
{
    public static readonly DiagnosticCode SingularFrf = new(
        "ENG060",
        "interface FRFs are singular",
        "Forces follow from motion by solving with the FRFs between the interface dofs. At a line where these are singular, for instance because two dofs move as one, there is no unique solution.",
        "the same accelerometer listed under two dofs",
        "Leave out a dof that another one implies, or repair the FRF that is zero.",
        ErrorKind.UnsupportedByData);

    public static readonly DiagnosticCode OneAverage = new(
        "ENG061",
        "one average says nothing about coherence",
        "Coherence compares averages with each other. From a single average it is 1 at every line, however noisy the measurement, so neither quality nor an error of the FRF follows from it.",
        "installed_frf: [{ file: bench.unv, coherence: coherence.unv, averages: 1 }]",
        "Give the number of averages that the coherence was estimated from, or leave `coherence` out.");

    public static readonly DiagnosticCode CoherenceOutOfRange = new(
        "ENG062",
        "a coherence is not between 0 and 1",
        "Coherence is the share of a response that the excitation explains, a number from 0 to 1. A value outside is no coherence: an FRF, a percentage or a level was taken for it, or the spectra behind it do not belong together.",
        "a coherence of 99.2 (per cent) or of 1.08",
        "Export γ² itself. Check that auto and cross spectra come from the same averages.");

    public static readonly DiagnosticCode CoherenceAlwaysOne = new(
        "ENG063",
        "the coherence is exactly 1 everywhere",
        "No measurement is without noise. A coherence of exactly 1 at every line of every FRF usually comes from one average, whatever number was given; errors derived from it are zero and mean nothing.",
        "`averages: 10` with coherences that were computed hit by hit",
        "Estimate the coherence over all averages. For computed FRFs leave `coherence` out.");

    public static readonly DiagnosticCode LowCoherence = new(
        "ENG064",
        "the coherence is low in a band",
        "Averaged over all FRFs, the excitation explains too little of the responses. The FRFs there are mostly noise, and what is identified from them is too.",
        "hammer hits that carry no energy above 1 kHz",
        "Use a harder tip, hit harder, average more, or end the band where the coherence ends.");

    public static readonly DiagnosticCode NotPassive = new(
        "ENG065",
        "the interface FRFs are not passive",
        "Whatever forces act at the interface, a structure without an own source only takes power from them: the Hermitian part of its mobility has no negative eigenvalue. Where it has, the FRFs contradict each other, even if every driving point looks right by itself.",
        "one column measured with the hammer force scaled wrongly",
        "Look for a column or row with a wrong sign, scale or axis, and for noise near antiresonances. Nothing is repaired silently.");

    public static readonly DiagnosticCode RoundTripTooShort = new(
        "ENG066",
        "a round trip has too few dofs",
        "The round-trip identity finds interface FRFs from paths between source and receiver. It needs at least as many dofs on the source and on the receiver as there are interface dofs.",
        "twelve interface dofs, six accelerometers on the receiver",
        "Measure at more dofs on the side that has too few, or estimate fewer interface dofs.");

    public static readonly DiagnosticCode ChannelSuspect = new(
        "ENG067",
        "a channel does not go with the others",
        "The forces that all other channels identify predict this channel differently than it was measured: with the opposite sign, by a constant factor, in the place of another channel, or not at all. Something changed between the installed FRFs and the operation, and it spreads into every force.",
        "an accelerometer turned over between hammer test and operation, or exported in g",
        "Check mounting, cable, axis, sensitivity and unit of the channel in both measurements. Until it is clear, leave it out of the `indicators`. Nothing is corrected silently.");
}
