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
}
