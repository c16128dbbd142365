using Boltup.Engine.Diagnostics;

namespace Boltup.Config;

/// <summary>Numbers, units and names.</summary>
public static partial class ConfigCodes
{
    public static readonly DiagnosticCode NoUnit = new(
        "CFG030", "quantity without unit",
        "Every value with a dimension carries its unit, so that nobody has to guess between N/m and N/mm.",
        "stiffness: 120",
        "Write the unit behind the number, such as `120 N/mm`.");

    public static readonly DiagnosticCode UnknownUnit = new(
        "CFG031", "unknown unit",
        "The unit is not in the table of units.",
        "mass: 0.8 kgs",
        "Use a unit that the message lists.");

    public static readonly DiagnosticCode WrongDimension = new(
        "CFG032", "unit of another quantity",
        "The unit exists but measures something else than the key is about.",
        "stiffness: 120 kg",
        "Write a unit of the quantity that the message names.");

    public static readonly DiagnosticCode NotANumber = new(
        "CFG033", "not a number",
        "The text cannot be read as a number. Numbers have a decimal point, never a comma, and no separators of "
            + "thousands.",
        "mass: 0,8 kg",
        "Write the number like `0.8`, `120` or `1.2e6`.");

    public static readonly DiagnosticCode UnitOnRatio = new(
        "CFG034", "unit on a ratio",
        "Ratios such as loss factor and scale are bare numbers.",
        "loss_factor: 12 %",
        "Write the ratio itself, such as `0.12`.");

    public static readonly DiagnosticCode BadName = new(
        "CFG035", "unusable name",
        "A name is empty, very long, has blanks at its ends or control characters, or holds a full stop where the "
            + "full stop separates part, point and direction.",
        "parts: { front.body: body.part.yaml }",
        "Choose another name; an underscore or a space does well in place of a full stop.");

    public static readonly DiagnosticCode ReservedName = new(
        "CFG036", "reserved name",
        "`ground` is the immovable point of every assembly and cannot name anything else.",
        "masses: { ground: 1 kg }",
        "Choose another name.");

    public static readonly DiagnosticCode BooleanName = new(
        "CFG037", "name that older readers take for a boolean",
        "Words like `on`, `no` and `true` without quotes are not text for many YAML readers, so that other "
            + "programs see another name.",
        "operations: { on: { ... } }",
        "Quote the name or choose another one.");

    public static readonly DiagnosticCode SameFileName = new(
        "CFG038", "names that give the same file name",
        "Output files are named after operations and responses: lower case, every run of other characters than "
            + "letters and digits becomes a hyphen. Two names give the same file, so one would overwrite the other.",
        "responses: { Driver ear: ..., driver-ear: ... }",
        "Rename one of them.");

    public static readonly DiagnosticCode BadDottedName = new(
        "CFG039", "name that is no point or dof",
        "Joints name points as `part.point`, responses name dofs as `part.point.direction`.",
        "seat: { at: body.seat }",
        "Write the name with all its pieces.");

    public static readonly DiagnosticCode BadText = new(
        "CFG040", "control character in a text",
        "A quoted text holds a control character, which could change what a terminal or a report shows.",
        "title: \"\\e[31mred\"",
        "Remove the escape.");

    public static readonly DiagnosticCode NoThirdOctave = new(
        "CFG100", "a band that is no third octave",
        "Bands of a target are named by the nominal centres of third octaves (IEC 61260-1), with their unit.",
        "third_octaves: { 70 Hz: 45 dB }",
        "Write 63 Hz or 80 Hz; the series is 1, 1.25, 1.6, 2, 2.5, 3.15, 4, 5, 6.3, 8 times powers of ten.");
}
