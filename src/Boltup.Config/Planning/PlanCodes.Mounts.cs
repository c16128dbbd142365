using Boltup.Engine.Diagnostics;

namespace Boltup.Config.Planning;

/// <summary>Diagnostics of planning mounts.</summary>
public static partial class PlanCodes
{
    public static readonly DiagnosticCode SeriesDoesNotJoin = new(
        "PLN080",
        "mounts in series that cannot be joined",
        "A direction that one of the mounts leaves free carries no force through the series. Where all directions are free nothing is left; and where a mount that couples directions or has mass effect takes part, the point between the mounts must be held in the same directions from both sides.",
        "mounts: { a: { stiffness: { x: 90 N/mm } }, b: { stiffness: { z: 90 N/mm } }, both: { series: [a, b] } }",
        "Name mounts that connect the same directions.");

    public static readonly DiagnosticCode ConditionNeeded = new(
        "PLN081",
        "nothing says which table of a family is meant",
        "The file lists the stiffness of a mount at several conditions, such as temperatures or preloads, in its column `at`. The document must name one of them.",
        "table: mounts/family.csv",
        "Write `table: { file: mounts/family.csv, at: 40 degC }` with a condition that the file lists.");

    public static readonly DiagnosticCode NoSuchCondition = new(
        "PLN082",
        "a table does not list the condition that is asked for",
        "Only conditions that were measured can be chosen. Nothing is interpolated between them, because rubber changes unevenly with temperature and preload.",
        "table: { file: mounts/family.csv, at: 45 degC }  # lists 20 degC and 40 degC",
        "Choose a condition that the message lists, or add the measured table to the file.");

    public static readonly DiagnosticCode TermMissing = new(
        "PLN083",
        "a two-port lacks a term",
        "A mount with mass effect needs the driving-point stiffness of both ends, k11 and k22, and a transfer stiffness.",
        "a table with the column `term` that holds k21 only",
        "Add the missing term; or, for a mount without mass effect, give its stiffness as a table without the column `term`.");

    public static readonly DiagnosticCode TransferTermFilled = new(
        "PLN084",
        "one transfer stiffness is taken from the other",
        "A passive mount is reciprocal: k12 and k21 are the same (ISO 10846-1), so one of them is enough.",
        "a table with k11, k21 and k22",
        "Nothing to do; measure both to see how good the measurement is.");

    public static readonly DiagnosticCode BadEnds = new(
        "PLN085",
        "ends of a mount that are not there",
        "A mount is identified between two points of the installation, one on each side of it. Both must be points of the part, and no point is an end of two mounts.",
        "boltup mount installed.part.yaml --between m1",
        "Name two points for each mount, such as `--between m1,b1 --between m2,b2`.");

    public static readonly DiagnosticCode EndsNotMeasured = new(
        "PLN086",
        "ends of mounts that are not fully measured",
        "Inverse substructuring inverts the FRFs between all ends of all mounts, so every end must be excited and must respond, and every pair of them must be there.",
        "an installation that was excited on the source side only",
        "Excite at both ends of every mount; where an end cannot be excited, `reciprocity: fill` takes the FRF from the other way round.");

    public static readonly DiagnosticCode NotMeasured = new(
        "PLN087",
        "an installation without measured lines",
        "Mounts are identified at the lines of a measurement. The part is a model, which has no lines of its own.",
        "boltup mount lumped.part.yaml --between m1,b1",
        "Name a part whose model is `frf`.");
}
