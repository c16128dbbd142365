using Boltup.Engine.Diagnostics;

namespace Boltup.Engine;

public static partial class EngineCodes
{
    public static readonly DiagnosticCode IndicatorRankLost = new(
        "ENG030",
        "the indicators cannot tell the forces apart",
        "At some lines a combination of blocked forces moves no indicator at all, so that any amount of it fits the measurement. Plain least squares has no answer there.",
        "two interface dofs whose FRFs come from the same file, or an indicator whose FRFs are zero",
        "Look at the singular values: correct the FRFs, add indicators, or leave lost directions out with `solve: { method: truncated, below: 1e-6 }`.",
        ErrorKind.UnsupportedByData);

    public static readonly DiagnosticCode IndicatorsIllConditioned = new(
        "ENG031",
        "some directions of the forces are uncertain",
        "The condition number of the indicator FRFs is large: some combination of forces is seen a thousand times less than another, and errors of the data fill it. This is usual where the source moves as a rigid body. What the forces do in a coupled assembly may be good all the same.",
        "twelve forces at four feet of a compact source at low frequency",
        "Judge by validation sensors and, better, by a second installation, not by single forces. More indicators at other places help; regularising rarely does.");

    public static readonly DiagnosticCode NoCommonPhase = new(
        "ENG032",
        "runs without a common phase cannot be averaged",
        "The operation says that its runs have one phase reference, but their spectra do not agree in phase. A mean of complex spectra without a common phase tends to zero with the number of runs, and what is left is noise.",
        "runs: [run1.uff, run2.uff, run3.uff], phase: common  # each started at its own moment",
        "Say `phase: free`: the runs are then added as cross-spectra, and blocked forces come as a matrix G_ff. Or process the recordings again with a tacho or a reference channel as phase reference.");

    public static readonly DiagnosticCode FewRuns = new(
        "ENG033",
        "fewer runs than forces",
        "Cross-spectra from n runs have rank n at most, so that G_ff cannot hold more than n independent mechanisms of the source.",
        "phase: free with 3 runs and 12 interface dofs",
        "Enough for a source with few independent mechanisms; otherwise measure more runs.");

    public static readonly DiagnosticCode SpectraNotHermitian = new(
        "ENG034",
        "cross-spectra that are none",
        "A matrix of auto and cross spectra is Hermitian, G_ij = conj(G_ji), with real diagonal entries that are not negative. Other numbers are a mistake of export: swapped sensors, a conjugated half, or FRFs instead of spectra.",
        "an auto spectrum with a negative value, or G_12 = G_21 with an imaginary part",
        "Export both halves from one processing run, or only one half: the other is filled by its conjugate.");

    public static readonly DiagnosticCode NoValidation = new(
        "ENG035",
        "nothing judges the forces",
        "No sensor was left out of the identification, so that nothing can say how well the forces predict what they were not fitted to.",
        "a bench without `validation`",
        "Name at least one point with `validation` that is not among the indicators.");

    public static readonly DiagnosticCode ValidationPoor = new(
        "ENG036",
        "the forces do not predict the validation sensors",
        "With the identified forces the sensors that took no part are off by more than is usual for a good bench. The forces will hardly transfer to a vehicle.",
        "a mean difference of 6 dB over the third octaves",
        "Look at validation.csv and at the suspects among the channels: a flipped or swapped sensor, an interface dof that was left out (rotations), another state of the source, or FRFs measured with other mounts.");
}
