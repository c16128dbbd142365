using Boltup.Engine.Diagnostics;

namespace Boltup.Cli;

/// <summary>Diagnostics of <c>boltup compare</c>.</summary>
internal static partial class CliCodes
{
    public static readonly DiagnosticCode NoAssemblyInFolder = new(
        "CLI013",
        "a folder without an assembly",
        "`boltup compare` takes two assembly files, or two folders that hold one assembly each. The folder holds none.",
        "boltup compare main/configs branch/config",
        "Name the assembly file itself, or the folder that holds it.");

    public static readonly DiagnosticCode SeveralAssembliesInFolder = new(
        "CLI014",
        "a folder with several assemblies",
        "`boltup compare` takes a folder only where it holds one assembly; which of several is meant cannot be told.",
        "boltup compare main/configs branch/configs",
        "Name the assembly file itself.");

    public static readonly DiagnosticCode NotCompared = new(
        "CLI015",
        "the assemblies do not have the same responses",
        "A response or an operation exists on one side only, or has other frequencies there. What both have is compared; this is not part of the verdict.",
        "a response that the changed assembly renames",
        "Nothing to do if that is meant; otherwise give it the same name on both sides.");

    public static readonly DiagnosticCode BadTolerance = new(
        "CLI016",
        "a tolerance that is none",
        "The tolerance of a comparison is by how many dB a level may rise: a number that is not negative.",
        "boltup compare a.assembly.yaml b.assembly.yaml --tolerance -1",
        "Give a number such as 0.5.");
}
