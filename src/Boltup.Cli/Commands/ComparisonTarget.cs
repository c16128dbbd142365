using Boltup.Engine.Diagnostics;

namespace Boltup.Cli.Commands;

/// <summary>What a user names as one side of a comparison: an assembly file, or a folder that holds one.</summary>
internal static class ComparisonTarget
{
    private const string Pattern = "*.assembly.yaml";

    /// <summary>The path of the assembly; a path that is no folder is taken as it is. Null after an error.</summary>
    public static string? Find(string path, DiagnosticBag diagnostics)
    {
        if (!Directory.Exists(path))
        {
            return path;
        }

        string[] found = [.. Directory.EnumerateFiles(path, Pattern).Order(StringComparer.Ordinal)];
        switch (found.Length)
        {
            case 1:
                return found[0];
            case 0:
                diagnostics.Error(CliCodes.NoAssemblyInFolder, $"folder `{path}` holds no `{Pattern}`", help: "name the assembly file");
                return null;
            default:
                diagnostics.Error(
                    CliCodes.SeveralAssembliesInFolder,
                    $"folder `{path}` holds {found.Length} assemblies, expected one",
                    help: $"name the one that is meant, such as `{found[0]}`");
                return null;
        }
    }
}
