using Boltup.Config;
using Boltup.Config.Schema;
using Boltup.Tests.Support;

namespace Boltup.Tests.Config.Schema;

/// <summary>The schemas under configs/schema, which editors read, and the comments by which the demo documents name them; pins are written by the program.</summary>
public class CommittedSchemaTests
{
    private const string Comment = "# yaml-language-server: $schema=";

    private static readonly string[] Folders = ["configs", "examples"];

    public static TheoryData<DocumentKind> Kinds => new(Enum.GetValues<DocumentKind>());

    public static TheoryData<string> Documents => new(
        Folders
            .SelectMany(folder => Directory.EnumerateFiles(Repository.PathTo(folder), "*.yaml", SearchOption.AllDirectories))
            .Where(path => !path.Contains($"{Path.DirectorySeparatorChar}out{Path.DirectorySeparatorChar}", StringComparison.Ordinal))
            .Where(path => !path.EndsWith(".pins.yaml", StringComparison.Ordinal))
            .Select(path => Path.GetRelativePath(Repository.PathTo(), path)));

    [Theory]
    [MemberData(nameof(Kinds))]
    public void CommittedSchema_OfEveryKind_IsWhatTheProgramWrites(DocumentKind kind)
    {
        string name = NameOf(kind);
        string path = Repository.PathTo("configs", "schema", $"{name}.json");
        string cure = $"run: dotnet run --project src/Boltup.Cli -- schema {name} > configs/schema/{name}.json";
        Assert.True(File.Exists(path), cure);
        Assert.True(JsonSchema.Of(kind) == File.ReadAllText(path).ReplaceLineEndings("\n"), $"configs/schema/{name}.json is out of date; {cure}");
    }

    [Theory]
    [MemberData(nameof(Documents))]
    public void DemoDocument_FirstLine_NamesTheSchemaOfItsKind(string document)
    {
        string[] lines = File.ReadAllLines(Repository.PathTo(document));
        string kind = lines.First(line => line.StartsWith("boltup: ", StringComparison.Ordinal))["boltup: ".Length..].Split('/')[0];
        string folder = Path.GetDirectoryName(Repository.PathTo(document))!;
        string schema = Path.GetRelativePath(folder, Repository.PathTo("configs", "schema", $"{kind}.json")).Replace('\\', '/');
        Assert.Equal(Comment + schema, lines[0]);
    }

    private static string NameOf(DocumentKind kind) => kind.ToString().ToLowerInvariant();
}
