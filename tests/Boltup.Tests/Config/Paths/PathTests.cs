using Boltup.Config;
using Boltup.Engine.Diagnostics;

namespace Boltup.Tests.Config.Paths;

public class PathTests
{
    private const string Part = "boltup: part/1\nfrf: [ { file: ../data/a.uff } ]\n";

    [Fact]
    public void LoadPart_PathOutOfTheFolder_IsRefusedUnlessAllowed()
    {
        using ConfigFolder folder = new ConfigFolder().With("parts/a.part.yaml", Part).With("data/a.uff", "");
        Assert.Null(folder.LoadPart("parts/a.part.yaml").Document);
        Assert.Equal("CFG071", Assert.Single(folder.Diagnostics.Items).Code.Code);

        folder.Options = new LoadOptions { AllowOutsidePaths = true };
        Assert.NotNull(folder.LoadPart("parts/a.part.yaml").Document);
    }

    [Fact]
    public void LoadPart_PathWithinTheRepository_IsAccepted()
    {
        using ConfigFolder folder = new ConfigFolder().With(".git/HEAD", "").With("parts/a.part.yaml", Part).With("data/a.uff", "");
        Assert.NotNull(folder.LoadPart("parts/a.part.yaml").Document);
    }

    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public void LoadPart_LinkOutOfTheTree_IsRefused(bool linksFolder)
    {
        using ConfigFolder outside = new ConfigFolder().With("a.uff", "");
        using ConfigFolder folder = new ConfigFolder().With("a.part.yaml", "boltup: part/1\nfrf: [ { file: data/a.uff } ]\n");
        string data = Path.Combine(folder.Root, "data");
        if (linksFolder)
        {
            Directory.CreateSymbolicLink(data, outside.Root);
        }
        else
        {
            Directory.CreateDirectory(data);
            File.CreateSymbolicLink(Path.Combine(data, "a.uff"), Path.Combine(outside.Root, "a.uff"));
        }

        Assert.Null(folder.LoadPart().Document);
        Assert.Equal("CFG071", Assert.Single(folder.Diagnostics.Items).Code.Code);
    }

    [Fact]
    public void LoadPart_LinkInsideTheTree_IsAccepted()
    {
        using ConfigFolder folder = new ConfigFolder().With("data/a.uff", "").With("a.part.yaml", "boltup: part/1\nfrf: [ { file: linked/a.uff } ]\n");
        Directory.CreateSymbolicLink(Path.Combine(folder.Root, "linked"), "data");
        Assert.NotNull(folder.LoadPart().Document);
    }

    [Fact]
    public void LoadPart_LinkToItself_IsADiagnostic()
    {
        using ConfigFolder folder = new ConfigFolder().With("a.part.yaml", "boltup: part/1\nfrf: [ { file: loop } ]\n");
        File.CreateSymbolicLink(Path.Combine(folder.Root, "loop"), "loop");
        Assert.Null(folder.LoadPart().Document);
        Assert.True(folder.Diagnostics.HasErrors);
    }

    [Fact]
    public void LoadPart_LinkToNothing_IsMissing()
    {
        using ConfigFolder folder = new ConfigFolder().With("a.part.yaml", "boltup: part/1\nfrf: [ { file: broken } ]\n");
        File.CreateSymbolicLink(Path.Combine(folder.Root, "broken"), "nothing");
        Assert.Null(folder.LoadPart().Document);
        Assert.Equal("CFG070", Assert.Single(folder.Diagnostics.Items).Code.Code);
    }

    [Fact]
    public void LoadPart_TopDocumentMissing_SuggestsTheNearestName()
    {
        using ConfigFolder folder = new ConfigFolder().With("a.part.yaml", Part);
        Assert.Null(folder.LoadPart("a.prt.yaml").Document);
        Diagnostic found = Assert.Single(folder.Diagnostics.Items);
        Assert.Equal(("CFG070", "did you mean `a.part.yaml`?", new SourceSpan("a.prt.yaml")), (found.Code.Code, found.Helps[0], found.Span));
    }

    [Fact]
    public void LoadPart_HugeDocument_IsRefused()
    {
        using ConfigFolder folder = new ConfigFolder { Options = new LoadOptions { MaximumDocumentBytes = 10 } }.With("a.part.yaml", Part);
        Assert.Null(folder.LoadPart().Document);
        Assert.Equal("CFG072", Assert.Single(folder.Diagnostics.Items).Code.Code);
    }

    [Fact]
    public void LoadPart_DocumentOutsideTheWorkingDirectory_ShowsItsFullPath()
    {
        using ConfigFolder folder = new ConfigFolder().With("parts/a.part.yaml", "boltup: part/1\n").With("inner/x", "");
        LoadOptions options = new() { WorkingDirectory = Path.Combine(folder.Root, "inner") };
        ConfigLoader.LoadPart("../parts/a.part.yaml", options, folder.Diagnostics);
        Assert.Equal(Path.Combine(folder.Root, "parts", "a.part.yaml"), folder.Diagnostics.Items[0].Span!.File);
    }
}
