using Boltup.Engine.Diagnostics;

namespace Boltup.Engine;

/// <summary>Diagnostics of the engine: what the physics or the data of an assembly do not allow.</summary>
public static partial class EngineCodes
{
    public static readonly DiagnosticCode SingularInterface = new(
        "ENG001",
        "the interface problem is singular",
        "At some lines the joints do not determine the joint forces: the same motion is constrained twice, a joint closes on itself, or a part cannot move where it is joined. The numbers would be noise, so nothing is computed.",
        "two rigid joints between the same two points",
        "Remove one of the joints that are named, make one of them resilient, or leave out the directions that are constrained twice. Points that sit rigidly close to each other are one point with rotations.",
        ErrorKind.UnsupportedByData);

    public static readonly DiagnosticCode IllConditionedInterface = new(
        "ENG002",
        "the interface problem is badly conditioned",
        "The 1-norm condition number of the interface problem is so large that errors of the FRFs, which are never better than a few digits when measured, may be magnified into the result.",
        "a rigid joint in nine directions on a nearly rigid bracket",
        "Look at the condition number over frequency in summary.json. Join fewer directions, use a virtual point with rotations instead of several close points, or improve the FRFs at these frequencies.");

    public static readonly DiagnosticCode NoUniqueResponse = new(
        "ENG003",
        "a lumped part has no unique response",
        "The dynamic stiffness matrix of the part is singular at a line: a mechanism, or an undamped resonance exactly on the line.",
        "lumped: { direction: x, masses: { a: 1 kg }, links: [{ between: [a, ground], stiffness: 39.478417604357434 N/m }] }  # 1 Hz, undamped",
        "Add damping or a loss factor, add the missing link or mass, or choose frequencies that avoid the line.",
        ErrorKind.UnsupportedByData);

    public static readonly DiagnosticCode ResponseNotReached = new(
        "ENG004",
        "a response is not reached by any force",
        "No chain of joints leads from the forces of the operation to the part of the response. It would be zero at all frequencies, which is hardly what was asked.",
        "a response on `seat`, while no joint connects `seat` with the part that is driven",
        "Add the joint that is missing, or remove the response.");

    public static readonly DiagnosticCode PartNotConnected = new(
        "ENG005",
        "a part is not connected",
        "The part takes part in no joint, while others do. Its neighbours are predicted as if it were not there.",
        "a part `bracket` without a joint",
        "Add the joint that is missing, or remove the part.");

    public static readonly DiagnosticCode MissingFrf = new(
        "ENG006",
        "a part lacks FRFs that the assembly needs",
        "Coupling needs every FRF between the interface dofs of a part, from them to its responses, and from the excited dofs to both. A set that differs on the two sides of a joint is a common cause.",
        "a joint in x, y and z on a part measured in z only",
        "Measure or compute the FRFs that are named, join only directions that both sides have, or say `reciprocity: fill` in the part if the reciprocal FRF was measured.");

    public static readonly DiagnosticCode NoCommonAxis = new(
        "ENG007",
        "there is no common frequency line",
        "Parts can only be coupled, and forces only be applied, at lines that all of them have.",
        "one part measured at 20, 21, … Hz and another at 20.5, 21.5, … Hz",
        "Give `frequencies` in the assembly to interpolate the FRFs to lines of your choice, or bring the data to one grid.",
        ErrorKind.UnsupportedByData);

    public static readonly DiagnosticCode ResponseInsideSource = new(
        "ENG008",
        "blocked forces do not predict responses inside their source",
        "Blocked forces replace the forces inside the source as far as its interface and everything beyond it are concerned. Inside the source the motion they give is wrong, not merely inexact.",
        "a response at a point of the compressor's housing under its blocked forces",
        "Ask for a response on another part, or at an interface point of the source. For motion inside the source apply its internal forces with `applied_forces`.");

    public static readonly DiagnosticCode BlockedForceOffInterface = new(
        "ENG009",
        "a blocked force acts at a point that carries no joint",
        "Blocked forces are defined at the interface, where the source is joined to the rest. A point without a joint is no interface.",
        "blocked forces for m1…m4 while only m1…m3 are joined",
        "Add the joint that is missing. If a force really acts at that point, use `applied_forces`.");

    public static readonly DiagnosticCode JointGap = new(
        "ENG010",
        "points that are joined do not coincide",
        "Both positions are known and further apart than the tolerance. A joint takes both points to be one place; the distance would act as a lever that the prediction does not know.",
        "between: [compressor.m1, body.b2] where b2 sits 174 mm away",
        "Check which points belong together, and `turned` and `moved` of the parts. If the distance is meant, set `joint_gap` in the assembly.");

    public static readonly DiagnosticCode FrfInterpolated = new(
        "ENG011",
        "FRFs were interpolated between their lines",
        "The assembly asks for frequencies that the data do not have. Real and imaginary parts were interpolated linearly, which misjudges a resonance that is narrower than about three lines.",
        "frequencies by 1 Hz from data by 5 Hz",
        "Ask for the lines of the data, or measure on a finer grid.");

    public static readonly DiagnosticCode OutsideBand = new(
        "ENG012",
        "data do not cover the frequencies asked for",
        "A part, a stiffness table or a force has no data at some of the frequencies of the assembly. Nothing is extrapolated.",
        "frequencies: { from: 5 Hz, … } with a stiffness table that begins at 10 Hz",
        "Narrow `frequencies` to the band of the data.");

    public static readonly DiagnosticCode FilledByReciprocity = new(
        "ENG013",
        "missing FRFs were taken from the reciprocal",
        "The part says `reciprocity: fill`. Where Y_ij was missing, Y_ji stands in for it; where p/F was missing, −v/q.",
        "reciprocity: fill",
        "Nothing to do if that is meant. The FRFs concerned are listed.");

    public static readonly DiagnosticCode ZeroFrequency = new(
        "ENG014",
        "a value at 0 Hz would be divided by zero",
        "Mobility and accelerance become receptance by division by jω. At 0 Hz that is undefined.",
        "frequencies: { from: 0 Hz, … } with accelerances",
        "Start `frequencies` above 0 Hz.");

    public static readonly DiagnosticCode NotFinite = new(
        "ENG015",
        "a value is no finite number",
        "A NaN or infinite value would spread over every result at its line.",
        "a Universal File with NaN at 0 Hz",
        "Repair the data, or leave the line out with `frequencies`.");

    public static readonly DiagnosticCode ForceLinesUnused = new(
        "ENG016",
        "force lines were not used",
        "The forces have lines at which the assembly has no FRFs. They are no part of the prediction, so levels lack their share.",
        "forces up to 3 kHz, FRFs up to 2 kHz",
        "Give `frequencies` that include the lines, or accept the narrower band.");

    public static readonly DiagnosticCode ForcesIncomplete = new(
        "ENG017",
        "blocked forces are missing at joined directions",
        "The source is joined in directions for which the operation has no blocked force. They are taken as zero, which a real source rarely is.",
        "blocked forces in z only, joints in x, y and z",
        "Identify the blocked forces in all directions in which the source is joined.");

    public static readonly DiagnosticCode AmplitudeAssumed = new(
        "ENG018",
        "amplitudes were taken as rms",
        "Neither the operation nor its file says whether a line is an rms or a peak value. Levels would be 3.01 dB too high if the values are peak.",
        "blocked_forces: { file: forces/2400rpm.csv, part: compressor }",
        "Say `amplitude: rms` or `amplitude: peak` in the operation.");

    public static readonly DiagnosticCode PowerGenerated = new(
        "ENG019",
        "a driving-point FRF generates power",
        "With e^{+jωt} the imaginary part of a driving-point receptance is never positive (Re mobility ≥ 0). Where it is, the sign, the axis, the time convention or the measurement is wrong.",
        "conjugated FRFs, a flipped sensor, excitation and response swapped",
        "Check the sign and axis of sensor and hammer at the point that is named, and whether the FRFs were conjugated on export.");

    public static readonly DiagnosticCode NotReciprocal = new(
        "ENG020",
        "FRFs are not reciprocal",
        "A linear passive structure responds at i to a force at j as it does at j to a force at i (Maxwell–Betti, Rayleigh). Where the two FRFs differ, a sensor or hammer position, axis or calibration differs between the two measurements.",
        "m1.x / m2.z measured with the sensor turned over",
        "Check position, direction and calibration of sensor and hammer at the two dofs that are named. Nothing is repaired silently.");

    public static readonly DiagnosticCode NothingAsked = new(
        "ENG021",
        "the assembly asks for nothing",
        "Without an operation there are no forces, and without a response or a joint there is nothing to read. The result files hold their headers only.",
        "an assembly that has parts and joints, but no `operations`",
        "Add `operations` with forces, and `responses` with the dofs that matter.");
}
