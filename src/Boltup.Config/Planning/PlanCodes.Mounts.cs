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
}
