using System.Globalization;
using System.Text.Json;
using System.Text.RegularExpressions;
using Boltup.Tests.Reports.Diagnostics;
using Boltup.Tests.Support;

namespace Boltup.Tests.Cli;

/// <summary>The comparison of the review example, as approved in Data/reports and in the example itself.</summary>
public partial class CompareCommandTests
{
    private static readonly string Base = Repository.PathTo("examples", "review", "main");
    private static readonly string Changed = Repository.PathTo("examples", "review", "branch");

    [Fact]
    public void Compare_ChangedMounts_PrintsDifferencesLevelsAndVerdict()
    {
        CommandRun run = CommandRun.Of("compare", Base, Changed);
        Assert.Equal((1, ""), (run.ExitCode, run.Error));
        Golden.Check("comparison.txt", Anywhere(run.Out));
    }

    [Fact]
    public void Compare_Full_PrintsBandsPathsAndEdits() => Golden.Check("comparison-full.txt", Anywhere(CommandRun.Of("compare", Base, Changed, "--full").Out));

    [Fact]
    public void Compare_Markdown_IsTheCommentOfTheExample()
    {
        string comment = File.ReadAllText(Repository.PathTo("examples", "review", "comment.md"));
        Assert.Equal(WithoutVersion(comment), WithoutVersion(Anywhere(CommandRun.Of("compare", Base, Changed, "--markdown").Out)));
    }

    [Fact]
    public void Compare_Json_HasTheApprovedShapeAndNumbers()
    {
        string json = CommandRun.Of("compare", Base, Changed, "--json").Out;
        using JsonDocument document = JsonDocument.Parse(json);
        Assert.Equal("comparison/1", document.RootElement.GetProperty("boltup").GetString());
        string stable = Regex.Replace(Anywhere(json), "\"program_version\": \"[^\"]*\"", "\"program_version\": \"\"");

        // Five digits: the last ones depend on the kernels of the machine.
        Golden.Check("comparison.json", LongNumber().Replace(stable, match => double.Parse(match.Value, CultureInfo.InvariantCulture).ToString("G5", CultureInfo.InvariantCulture)));
    }

    [Fact]
    public void Compare_ReformattedCopy_IsNoDifference()
    {
        CommandRun run = CommandRun.Of("compare", Base, Repository.PathTo("examples", "review", "reformatted"));
        Assert.Equal((0, ""), (run.ExitCode, run.Error));
        Assert.EndsWith("The inputs are identical.\n", run.Out, StringComparison.Ordinal);
    }

    [Fact]
    public void Compare_ItselfWithOutput_WritesThatNothingDiffers()
    {
        using var folder = new TemporaryFolder();
        CommandRun run = CommandRun.Of("compare", Base, Base, "-o", folder.PathTo("out"));
        Assert.Equal(0, run.ExitCode);
        using JsonDocument json = JsonDocument.Parse(File.ReadAllBytes(folder.PathTo("out", "comparison.json")));
        Assert.Equal("identical", json.RootElement.GetProperty("verdict").GetString());
        Assert.Equal(0, json.RootElement.GetProperty("responses").GetArrayLength());
    }

    [Fact]
    public void Compare_ToleranceAboveTheRise_EndsWithZero() => Assert.Equal(0, CommandRun.Of("compare", Base, Changed, "--tolerance", "2").ExitCode);

    /// <summary>Backwards the seat rail loses the target that it gained.</summary>
    [Fact]
    public void Compare_LostTarget_EndsWithOneWhateverTheTolerance()
    {
        CommandRun run = CommandRun.Of("compare", Changed, Base, "--tolerance", "30");
        Assert.Equal(1, run.ExitCode);
        Assert.Contains("Targets lost: seat rail overall in 5400 rpm.", run.Out, StringComparison.Ordinal);
    }

    [Fact]
    public void Compare_Output_WritesMarkdownWithPicturesBesideIt()
    {
        using var folder = new TemporaryFolder();
        CommandRun run = CommandRun.Of("compare", Base, Changed, "-o", folder.PathTo("out"), "--markdown");
        string[] pictures = [.. Directory.EnumerateFiles(folder.PathTo("out"), "*.png").Select(path => Path.GetFileName(path)!)];
        Assert.Equal(5, pictures.Length);
        string markdown = File.ReadAllText(folder.PathTo("out", "comparison.md"));
        Assert.All(pictures, picture => Assert.Contains($"![{picture}]({picture})", markdown, StringComparison.Ordinal));
        Assert.Equal(markdown, run.Out);
    }

    [Fact]
    public void Compare_Twice_GivesTheSameBytes()
    {
        using var folder = new TemporaryFolder();
        foreach (string name in new[] { "a", "b" })
        {
            CommandRun.Of("compare", Base, Changed, "-o", folder.PathTo(name));
        }

        foreach (string file in Directory.EnumerateFiles(folder.PathTo("a")))
        {
            Assert.Equal(File.ReadAllBytes(file), File.ReadAllBytes(folder.PathTo("b", Path.GetFileName(file))));
        }
    }

    [Fact]
    public void Compare_UnderADecimalComma_PrintsTheSame()
    {
        string expected = CommandRun.Of("compare", Base, Changed, "--full").Out;
        CultureInfo before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo("de-DE");
            Assert.Equal(expected, CommandRun.Of("compare", Base, Changed, "--full").Out);
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    [Fact]
    public void Compare_ResponsesOfOneSideOnly_AreNamedAndTheOthersCompared()
    {
        using var folder = new TemporaryFolder();
        string changed = Moved(folder, text => text
            .Replace("  floor: {", "  floor plate: {", StringComparison.Ordinal).Replace("z: 300 N/mm", "z: 345 N/mm", StringComparison.Ordinal));
        CommandRun run = CommandRun.Of("compare", Base, changed, "--allow-outside");
        Assert.Equal(0, run.ExitCode);
        Assert.Contains("warning[CLI015]: only the base has response `floor` in m/s²", run.Error, StringComparison.Ordinal);
        Assert.Contains("warning[CLI015]: only the changed assembly has response `floor plate` in m/s²", run.Error, StringComparison.Ordinal);
        Assert.Contains("seat rail", run.Out, StringComparison.Ordinal);
    }

    [Fact]
    public void Compare_TitleOnly_ComputesNothing()
    {
        using var folder = new TemporaryFolder();
        string changed = folder.Write("a.assembly.yaml", $"boltup: assembly/1\nbased_on: {Base}/minibus.assembly.yaml\ntitle: another\n");
        CommandRun run = CommandRun.Of("compare", Base, changed, "--allow-outside");
        Assert.Equal(0, run.ExitCode);
        Assert.Contains("title: Electric minibus, compressor on front and rear mounts → another (no effect)", run.Out, StringComparison.Ordinal);
        Assert.EndsWith("Nothing differs that a result depends on.\n", run.Out, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(0, "CLI013")]
    [InlineData(2, "CLI014")]
    public void Compare_FolderWithoutOneAssembly_IsRefused(int assemblies, string code)
    {
        using var folder = new TemporaryFolder();
        for (int i = 0; i < assemblies; i++)
        {
            folder.Write($"{i}.assembly.yaml", "boltup: assembly/1\n");
        }

        CommandRun run = CommandRun.Of("compare", Base, folder.Path);
        Assert.Equal(2, run.ExitCode);
        Assert.Contains(code, run.Error, StringComparison.Ordinal);
    }

    [Fact]
    public void Compare_NegativeTolerance_IsRefused()
    {
        CommandRun run = CommandRun.Of("compare", Base, Changed, "--tolerance=-1");
        Assert.Equal(2, run.ExitCode);
        Assert.Contains("CLI016", run.Error, StringComparison.Ordinal);
    }

    [Fact]
    public void Compare_MissingBase_NamesTheFile()
    {
        CommandRun run = CommandRun.Of("compare", Path.Combine(Base, "minibuss.assembly.yaml"), Changed);
        Assert.Equal(2, run.ExitCode);
        Assert.Contains("error[CFG070]", run.Error, StringComparison.Ordinal);
    }

    /// <summary>The changed assembly elsewhere, with a change of its own.</summary>
    private static string Moved(TemporaryFolder folder, Func<string, string> change) => folder.Write(
        "moved.assembly.yaml",
        change(File.ReadAllText(Path.Combine(Changed, "minibus.assembly.yaml")))
            .Replace("../../../configs", Repository.PathTo("configs"), StringComparison.Ordinal)
            .Replace("../../minibus", Repository.PathTo("examples", "minibus"), StringComparison.Ordinal));

    /// <summary>Paths as from the root of the repository.</summary>
    private static string Anywhere(string text) => text.Replace($"{Repository.Root}/", "", StringComparison.Ordinal);

    private static string WithoutVersion(string markdown) => Regex.Replace(markdown, "(?m)^<sub>.*$", "");

    [GeneratedRegex(@"(?<![\w.])-?\d+\.\d{4,}(E[-+]?\d+)?")]
    private static partial Regex LongNumber();
}
