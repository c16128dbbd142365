using Boltup.Engine.Diagnostics;

namespace Boltup.Config.Planning;

/// <summary>Diagnostics of planning: what a document and its data files do not agree on.</summary>
public static partial class PlanCodes
{
    public static readonly DiagnosticCode NoCurves = new(
        "PLN001",
        "a data file holds nothing of the kind that is needed",
        "The file can be read, but none of its functions is of the kind that the document needs: FRFs for a part, force spectra for an operation, stiffness for a mount table.",
        "frf: [{ file: coherence.unv }]",
        "Run `boltup inspect` on the file to see what it holds, and name the right file.");

    public static readonly DiagnosticCode QuantityUnknown = new(
        "PLN002",
        "nothing says what quantity the FRFs are",
        "Receptance, mobility and accelerance differ by jω, that is by many decibels and a turn of phase. Neither the file nor the document says which of them the values are.",
        "frf: [{ file: extra.csv }]",
        "Add `quantity: receptance`, `mobility` or `accelerance` to the file's entry.");

    public static readonly DiagnosticCode QuantityConflict = new(
        "PLN003",
        "document and file disagree about the quantity of the FRFs",
        "The file states a quantity of its own, and the document another one. One of them is wrong by a factor of jω or ω².",
        "frf: [{ file: compressor.unv, quantity: receptance }]  # the file says accelerance",
        "Remove `quantity` if the file is right; correct the export if it is wrong.");

    public static readonly DiagnosticCode DuplicateCurve = new(
        "PLN004",
        "an FRF is given twice",
        "Two functions relate the same response to the same excitation. Which of them is meant cannot be told.",
        "two files that both hold m1.z / m1.z",
        "Remove one of them from the files or from the list.");

    public static readonly DiagnosticCode CurvesLeftOut = new(
        "PLN005",
        "functions of a data file were not used",
        "The file holds functions at nodes that the part does not list as points, or functions of another kind. They play no role.",
        "a file with node 250, which is no point of the part",
        "Nothing to do if that is meant; otherwise list the point with its `node`.");

    public static readonly DiagnosticCode NoSharedLines = new(
        "PLN006",
        "the FRFs of a part have no common frequency line",
        "The files of one part are on different grids.",
        "one file at 20, 21, … Hz, another at 20.5, 21.5, … Hz",
        "Bring the files to one grid.",
        ErrorKind.UnsupportedByData);

    public static readonly DiagnosticCode MixedAxes = new(
        "PLN007",
        "the spectra of a force file are on different lines",
        "Forces of one file act together, so they must be given at the same frequencies.",
        "m1.z at 20, 25, … Hz and m2.z at 20, 30, … Hz",
        "Give every force at every line; a force that is zero is written as 0.");

    public static readonly DiagnosticCode FrequenciesNeeded = new(
        "PLN008",
        "nothing says at which frequencies to compute",
        "No part has lines of its own, as all are models, and no operation has forces whose lines could be taken.",
        "an assembly of lumped parts without `frequencies`",
        "Add `frequencies: { from: 10 Hz, to: 500 Hz, step: 1 Hz }` to the assembly.");

    public static readonly DiagnosticCode NotAForce = new(
        "PLN009",
        "a spectrum in a force file is no force",
        "The function has a response quantity other than force (or moment, or volume velocity at `q`), so it cannot act on a part.",
        "operational accelerations given as blocked_forces",
        "Name a file of forces. Forces are identified from operational accelerations and FRFs first.");

    public static readonly DiagnosticCode NodeTwice = new(
        "PLN010",
        "two points have the same node",
        "Each function of a Universal File belongs to one node, and so to one point.",
        "points: { m1: { node: 101 }, m2: { node: 101 } }",
        "Correct the node of one of the points.");

    public static readonly DiagnosticCode QuantityNotUsable = new(
        "PLN011",
        "an FRF relates quantities that coupling cannot use",
        "A part needs motion or sound pressure per force or volume velocity.",
        "transmissibilities, or strain per force",
        "Leave the functions out of the file, or name another one.");
}
