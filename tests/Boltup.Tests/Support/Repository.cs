namespace Boltup.Tests.Support;

/// <summary>Paths of the repository that the tests run in.</summary>
internal static class Repository
{
    public static string Root { get; } = FindRoot(AppContext.BaseDirectory);

    /// <summary>A file of the repository by its parts, from the root.</summary>
    public static string PathTo(params string[] parts) => Path.Combine([Root, .. parts]);

    /// <summary>A file below <c>tests/Boltup.Tests/Data</c>.</summary>
    public static string Data(params string[] parts) => PathTo(["tests", "Boltup.Tests", "Data", .. parts]);

    /// <summary>The nearest folder above that holds the solution; paths in the compiled code are no help, as CI builds map them away.</summary>
    private static string FindRoot(string folder) =>
        File.Exists(Path.Combine(folder, "Assembly.sln")) ? folder : FindRoot(Path.GetDirectoryName(folder)!);
}
