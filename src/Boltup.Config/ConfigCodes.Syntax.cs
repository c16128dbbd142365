using Boltup.Engine.Diagnostics;

namespace Boltup.Config;

/// <summary>Text that is no acceptable YAML document.</summary>
public static partial class ConfigCodes
{
    public static readonly DiagnosticCode Malformed = new(
        "CFG001", "malformed YAML",
        "The text breaks the rules of YAML at this place, so nothing after it can be read. Often a bracket, a "
            + "comma or a space after a colon is missing a little earlier.",
        "m1: { node: 101, at: [92 mm, 61 mm, 0 mm }",
        "Correct the text at or before the place shown. Quote a text that contains a colon followed by a space, or "
            + "that begins with a special character.");

    public static readonly DiagnosticCode NotUtf8 = new(
        "CFG002", "not UTF-8 text",
        "Documents are UTF-8. Other encodings turn names and units into something else without a warning, and "
            + "control characters hide in editors.",
        "a file saved as Latin-1 with `µm` in it",
        "Save the file as UTF-8 and remove control characters.");

    public static readonly DiagnosticCode TooLarge = new(
        "CFG003", "document out of bounds",
        "The document is nested deeper, or holds more values or errors, than a document written by people does. Reading "
            + "stops to protect the machine.",
        "a: [[[[[[[[[[[[[[[[[[[[[[[[[[ 1 ]]]]]]]]]]]]]]]]]]]]]]]]]]",
        "Check that the file is the one that is meant; then correct the first errors and run again.");

    public static readonly DiagnosticCode Anchor = new(
        "CFG004", "anchor or alias",
        "Anchors and aliases are not read: a few lines of them can stand for gigabytes, and a reviewer cannot see "
            + "what a line changes.",
        "softer: *soft",
        "Write the value out. For mounts use `like`, for whole assemblies `based_on`.");

    public static readonly DiagnosticCode Tag = new(
        "CFG005", "tag or directive",
        "Tags such as `!!str` and directives such as `%TAG` are not read: the meaning of every key is fixed by the kind of the document.",
        "title: !!str Compressor",
        "Remove the tag or directive; quote the value where it must be a text.");

    public static readonly DiagnosticCode SeveralDocuments = new(
        "CFG006", "several documents in one file",
        "A file holds one document. A second one after `---` would be ignored silently by many readers.",
        "boltup: part/1\n---\nboltup: part/1",
        "Put every document into a file of its own.");

    public static readonly DiagnosticCode TabIndentation = new(
        "CFG007", "tab in the indentation",
        "YAML forbids tabs in indentation, and programs disagree on how wide they are.",
        "joints:\n	front: { between: [a.m1, b.b1], rigid: [z] }",
        "Indent with spaces.");

    public static readonly DiagnosticCode MergeKey = new(
        "CFG008", "merge key",
        "The merge key `<<` of older YAML is not read.",
        "softer: { <<: *soft, loss_factor: 0.2 }",
        "Write the keys out. For mounts use `like`, for whole assemblies `based_on`.");

    public static readonly DiagnosticCode OddKey = new(
        "CFG009", "key that is no text",
        "A key is empty, a list or a map, where a plain text is expected.",
        "{ [x, y]: 120 N/mm }",
        "Use one plain text as key.");

    public static readonly DiagnosticCode EmptyDocument = new(
        "CFG010", "empty document",
        "The file holds no document.",
        "an empty file",
        "Begin with `boltup: part/1` or `boltup: assembly/1`.");

    public static readonly DiagnosticCode DuplicateKey = new(
        "CFG011", "key that occurs twice",
        "A map has the same key twice. Which of the two values counts would depend on the reader.",
        "soft: { like: base, like: other }",
        "Remove or rename one of the two.");
}
