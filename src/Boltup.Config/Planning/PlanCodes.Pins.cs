using Boltup.Engine.Diagnostics;

namespace Boltup.Config.Planning;

/// <summary>Data files against their pins.</summary>
public static partial class PlanCodes
{
    public static readonly DiagnosticCode PinDoesNotMatch = new(
        "PLN090",
        "a data file is not the one that was pinned",
        "The SHA-256 of the file differs from the one in the pins file, so the file changed since somebody pinned it. Such a change of a binary file does not show in a review otherwise.",
        "a measurement that was exported again, with the pins left as they were",
        "Restore the file. If the change is meant, run `boltup pin --accept` and commit the pins with the data.");

    public static readonly DiagnosticCode PinMissing = new(
        "PLN091",
        "a data file is not pinned",
        "The assembly has a pins file, and this data file is not in it: a change of it would go unnoticed.",
        "a mount table that was added after `boltup pin`",
        "Run `boltup pin --accept` and commit the pins with the change.");

    public static readonly DiagnosticCode PinUnused = new(
        "PLN092",
        "a pinned file is not used",
        "The pins file lists a file that the assembly does not read, or no longer.",
        "a mount table that was replaced by a law",
        "Run `boltup pin --accept`, which drops it.");

    public static readonly DiagnosticCode PinsDiffer = new(
        "PLN093",
        "the pins would change",
        "There is a pins file already, and the data files are no longer those that it describes. It is not overwritten without being asked.",
        "boltup pin minibus.assembly.yaml  # after a data file was exported again",
        "Look at the files that are named. If the changes are meant, run `boltup pin --accept`.");

    public static readonly DiagnosticCode PinsNotWritten = new(
        "PLN094",
        "the pins cannot be written",
        "The operating system refuses to create or replace the pins file beside the assembly.",
        "boltup pin /read-only/minibus.assembly.yaml",
        "Check the permissions of the folder.");

    public static readonly DiagnosticCode PinsOfAnother = new(
        "PLN095",
        "pins of another assembly",
        "A pins file names the assembly that it belongs to. It was copied or renamed, so its digests say nothing about this assembly.",
        "boltup: pins/1\nassembly: minibus.assembly.yaml  # in a file that is named after another assembly",
        "Remove the file, and pin this assembly with `boltup pin`.");
}
