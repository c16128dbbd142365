using System.Text.RegularExpressions;
using System.Xml.Linq;
using Boltup.Tests.Support;

namespace Boltup.Tests.Architecture;

/// <summary>What DEVELOPERS.md promises about layers and habits.</summary>
public class LayerTests
{
    private const int LongestFile = 400;

    private static readonly Dictionary<string, string[]> AllowedProjects = new()
    {
        ["Boltup.Engine"] = [],
        ["Boltup.Files"] = ["Boltup.Engine"],
        ["Boltup.Config"] = ["Boltup.Engine", "Boltup.Files"],
        ["Boltup.Reports"] = ["Boltup.Engine"],
        ["Boltup.Cli"] = ["Boltup.Config", "Boltup.Engine", "Boltup.Files", "Boltup.Reports"],
    };

    private static readonly Dictionary<string, string[]> AllowedPackages = new()
    {
        ["Boltup.Engine"] = ["MathNet.Numerics", "MathNet.Numerics.Providers.MKL"],
        ["Boltup.Files"] = [],
        ["Boltup.Config"] = ["YamlDotNet"],
        ["Boltup.Reports"] = ["ScottPlot"],
        ["Boltup.Cli"] = ["System.CommandLine"],
    };

    public static TheoryData<string> Projects => [.. AllowedProjects.Keys];

    [Theory]
    [MemberData(nameof(Projects))]
    public void Project_References_PointDownOnly(string project)
    {
        XDocument file = XDocument.Load(Repository.PathTo("src", project, $"{project}.csproj"));
        Assert.Equal(
            AllowedProjects[project],
            Includes(file, "ProjectReference").Select(path => Path.GetFileNameWithoutExtension(path)).Order(StringComparer.Ordinal));
        Assert.Equal(AllowedPackages[project], Includes(file, "PackageReference").Order(StringComparer.Ordinal));
    }

    [Fact]
    public void TopLevel_HoldsExactlyWhatAReaderExpects() =>
        Assert.Equal(
            ["Assembly.sln", "DEVELOPERS.md", "LICENSE", "README.md", "configs", "examples", "src", "tests"],
            Directory.EnumerateFileSystemEntries(Repository.Root)
                .Select(entry => Path.GetFileName(entry)!)
                .Where(name => !name.StartsWith('.') && name is not "out")
                .Order(StringComparer.Ordinal));

    [Fact]
    public void Console_OutsideTheCommandLine_IsNotUsed() =>
        AssertNowhere(new Regex(@"\bConsole\."), path => !path.StartsWith("src/Boltup.Cli/", StringComparison.Ordinal));

    [Fact]
    public void Clock_InAnyLayer_IsNotReadAsLocalTime() => AssertNowhere(new Regex(@"DateTime\.Now|DateTimeOffset\.Now"), _ => true);

    [Fact]
    public void Culture_InAnyLayer_IsNeverTheCurrentOne() =>
        AssertNowhere(new Regex(@"CurrentCulture(?!IgnoreCase)|CurrentUICulture|StringComparison\.CurrentCulture"), _ => true);

    [Fact]
    public void SourceFile_OfAnyLayer_IsOneRoom() =>
        Assert.Empty(SourceFiles().Where(path => File.ReadLines(path).Count() > LongestFile).Select(Relative));

    [Fact]
    public void SourceFile_OfAnyLayer_IsFinished() => AssertNowhere(new Regex(@"\bTODO\b|\bFIXME\b|NotImplementedException"), _ => true);

    private static IEnumerable<string> Includes(XDocument project, string element) =>
        project.Descendants(element).Select(reference => reference.Attribute("Include")!.Value);

    private static IEnumerable<string> SourceFiles() =>
        Directory.EnumerateFiles(Repository.PathTo("src"), "*.cs", SearchOption.AllDirectories)
            .Where(path => !path.Contains($"{Path.DirectorySeparatorChar}obj{Path.DirectorySeparatorChar}", StringComparison.Ordinal));

    private static string Relative(string path) => Path.GetRelativePath(Repository.Root, path).Replace('\\', '/');

    private static void AssertNowhere(Regex pattern, Func<string, bool> concerns)
    {
        string[] found = [.. SourceFiles()
            .Where(path => concerns(Relative(path)))
            .SelectMany(path => File.ReadLines(path).Select((line, i) => (Line: line, Place: $"{Relative(path)}:{i + 1}")))
            .Where(line => pattern.IsMatch(line.Line))
            .Select(line => $"{line.Place}: {line.Line.Trim()}")];
        Assert.Empty(found);
    }
}
