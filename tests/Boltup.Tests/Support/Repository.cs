using System.Runtime.CompilerServices;

namespace Boltup.Tests.Support;

/// <summary>Paths of the repository that the tests run in.</summary>
internal static class Repository
{
    public static string Root { get; } = Path.GetFullPath(Path.Combine(Path.GetDirectoryName(ThisFile())!, "..", "..", ".."));

    /// <summary>A file of the repository by its parts, from the root.</summary>
    public static string PathTo(params string[] parts) => Path.Combine([Root, .. parts]);

    /// <summary>A file below <c>tests/Boltup.Tests/Data</c>.</summary>
    public static string Data(params string[] parts) => PathTo(["tests", "Boltup.Tests", "Data", .. parts]);

    private static string ThisFile([CallerFilePath] string path = "") => path;
}
