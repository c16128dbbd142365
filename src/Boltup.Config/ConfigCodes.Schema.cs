using Boltup.Engine.Diagnostics;

namespace Boltup.Config;

/// <summary>Keys and values that do not fit the kind of document.</summary>
public static partial class ConfigCodes
{
    public static readonly DiagnosticCode UnknownKey = new(
        "CFG012", "unknown key",
        "The key is not one that the map can have. An ignored key would be a value that silently does nothing.",
        "front: { stifness: 120 N/mm }",
        "Correct the spelling, or remove the key.");

    public static readonly DiagnosticCode MissingKey = new(
        "CFG013", "missing key",
        "A key that the map cannot do without is not there.",
        "frequencies: { from: 20 Hz, to: 2000 Hz }",
        "Add the key.");

    public static readonly DiagnosticCode WrongKind = new(
        "CFG014", "value of the wrong kind",
        "The value is a map, a list, a single value or nothing where something else is expected.",
        "masses: [1.5 kg, 0.7 kg]",
        "Write the value in the form that the message names.");

    public static readonly DiagnosticCode OneOf = new(
        "CFG015", "choice between keys",
        "Some keys exclude each other because each answers the same question; one of them has to be there.",
        "front: { between: [a.m1, b.b1], rigid: [z], through: soft }",
        "Keep exactly one. In an overlay remove the one that the base gives with `~`.");

    public static readonly DiagnosticCode NotAllowed = new(
        "CFG016", "value that is not among the allowed ones",
        "The key takes one of a few words, and this is none of them.",
        "seat: { at: body.seat.z, as: acceleraton }",
        "Use one of the words that the message lists.");

    public static readonly DiagnosticCode OutOfRange = new(
        "CFG017", "number out of range",
        "The number has a sign or size that the quantity cannot have, such as a negative stiffness or loss factor.",
        "loss_factor: -0.1",
        "Correct the number.");

    public static readonly DiagnosticCode WrongCount = new(
        "CFG018", "wrong number of items",
        "A list or map has too few or too many items.",
        "at: [92 mm, 61 mm]",
        "Give as many items as the message says.");

    public static readonly DiagnosticCode NotSupportedYet = new(
        "CFG019", "not supported yet by this version",
        "The word is reserved for something that this version of the program does not do yet.",
        "rigid_body: { mass: 4 kg }",
        "Leave it out, describe the part in another way, or use a newer version.");

    public static readonly DiagnosticCode WrongHeader = new(
        "CFG020", "wrong first key",
        "Every document begins with `boltup: kind/version`, so that people and programs know what it is.",
        "boltup: assembly/7",
        "Begin with `boltup: part/1` or `boltup: assembly/1`, as the command expects.");

    public static readonly DiagnosticCode NeedsOtherKey = new(
        "CFG021", "key that means nothing here",
        "The key only has a meaning together with another key or value, which is not there.",
        "mounts: { soft: { table: soft.csv, loss_factor: 0.1 } }",
        "Add the other key or remove this one.");

    public static readonly DiagnosticCode ListedTwice = new(
        "CFG022", "value listed twice",
        "A list that stands for a set names the same value twice.",
        "rigid: [x, y, x]",
        "Remove one of the two.");
}
