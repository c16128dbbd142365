using System.Text.Json;
using Boltup.Cli.Commands;
using Boltup.Engine.Diagnostics;
using Boltup.Tests.Support;

namespace Boltup.Tests.Cli;

public class OtherCommandTests
{
    /// <summary>
    /// Constant loss factors; one line of the invented bench where the noise shows; and the bench as an assembly, which is there to be
    /// coupled and predicts nothing by itself.
    /// </summary>
    [Fact]
    public void Check_EveryDemoDocument_FindsWhatIsMeantToBeFound()
    {
        string[] documents =
            [.. Directory.EnumerateFiles(Repository.PathTo("configs"), "*.yaml", SearchOption.AllDirectories)
                .Concat(Directory.EnumerateFiles(Repository.PathTo("examples"), "*.yaml", SearchOption.AllDirectories))];
        CommandRun run = CommandRun.Of(["check", "--messages", "lines", .. documents]);
        Assert.Equal(0, run.ExitCode);
        string[] lines = run.Error.Split('\n', StringSplitOptions.RemoveEmptyEntries);
        Assert.Single(lines, line => line.Contains("ENG064", StringComparison.Ordinal));
        Assert.Single(lines, line => line.Contains("ENG021", StringComparison.Ordinal));
        Assert.Equal(2, lines.Count(line => !line.Contains("ENG121", StringComparison.Ordinal)));
        Assert.Equal($"{documents.Length} files checked: 2 warnings\n", run.Out);
    }

    [Fact]
    public void Inspect_UniversalFile_NamesDofsQuantityAndAxis()
    {
        CommandRun run = CommandRun.Of("inspect", Repository.PathTo("examples", "minibus", "ears.unv"));
        Assert.Equal(0, run.ExitCode);
        Assert.Contains("Universal File 58b, 24 functions", run.Out, StringComparison.Ordinal);
        Assert.Contains("24 × FRF, pressure per force, complex double", run.Out, StringComparison.Ordinal);
        Assert.Contains("20 to 1000 Hz by 5 Hz, 197 lines", run.Out, StringComparison.Ordinal);
    }

    [Fact]
    public void Explain_EveryCode_SaysMeaningExampleAndCure()
    {
        foreach (DiagnosticCode code in DiagnosticCatalogue.All)
        {
            Assert.Matches("^[A-Z]{3}[0-9]{3}$", code.Code);
            Assert.True(char.IsLower(code.Title[0]) || char.IsUpper(code.Title[1]) || code.Title[0] == '`' || char.IsUpper(code.Title[0]));
            Assert.False(code.Title.EndsWith('.'));
            Assert.EndsWith(".", code.Meaning, StringComparison.Ordinal);
            Assert.NotEmpty(code.Example);
            Assert.NotEmpty(code.Cure);
        }
    }

    [Fact]
    public void Explain_Codes_AreUnique() =>
        Assert.Empty(DiagnosticCatalogue.All.GroupBy(code => code.Code).Where(group => group.Count() > 1).Select(group => group.Key));

    [Fact]
    public void Explain_KnownCode_PrintsIt()
    {
        CommandRun run = CommandRun.Of("explain", "eng008");
        Assert.Equal(0, run.ExitCode);
        Assert.StartsWith("ENG008: blocked forces do not predict responses inside their source\n", run.Out, StringComparison.Ordinal);
    }

    [Fact]
    public void Explain_UnknownCode_SuggestsTheNearest()
    {
        CommandRun run = CommandRun.Of("explain", "CFG0012");
        Assert.Equal(2, run.ExitCode);
        Assert.Contains("error[CLI002]", run.Error, StringComparison.Ordinal);
        Assert.Contains("did you mean", run.Error, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("part")]
    [InlineData("assembly")]
    public void Schema_Kind_IsJson(string kind)
    {
        CommandRun run = CommandRun.Of("schema", kind);
        Assert.Equal(0, run.ExitCode);
        using JsonDocument schema = JsonDocument.Parse(run.Out);
        Assert.Equal(JsonValueKind.Object, schema.RootElement.ValueKind);
    }

    [Theory]
    [InlineData("--help")]
    [InlineData("predict", "--help")]
    [InlineData("check", "--help")]
    [InlineData("inspect", "--help")]
    [InlineData("explain", "--help")]
    [InlineData("schema", "--help")]
    public void Help_OfEveryCommand_BeginsWithAnExample(params string[] args)
    {
        CommandRun run = CommandRun.Of(args);
        Assert.Equal(0, run.ExitCode);
        Assert.Contains("Example: boltup ", run.Out[..Math.Min(400, run.Out.Length)], StringComparison.Ordinal);
    }

    [Fact]
    public void Messages_AsLinesAndJson_CarryCodeAndPlace()
    {
        using var folder = new TemporaryFolder();
        string path = folder.Write("a.assembly.yaml", "boltup: assembly/1\nparst: {}\n");
        CommandRun lines = CommandRun.Of("check", path, "--messages", "lines");
        Assert.Equal(2, lines.ExitCode);
        Assert.Contains($":2:1: error[CFG012]: unknown key `parst`", lines.Error, StringComparison.Ordinal);
        CommandRun json = CommandRun.Of("check", path, "--messages", "json");
        using JsonDocument document = JsonDocument.Parse(json.Error);
        Assert.Equal("diagnostics/1", document.RootElement.GetProperty("boltup").GetString());
    }
}
