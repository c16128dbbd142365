using Boltup.Config;
using Boltup.Config.Documents;
using Boltup.Engine.Spectra;

namespace Boltup.Tests.Config.Overlays;

public class OverlayTests
{
    private const string Head = "boltup: assembly/1\nbased_on: ../a.assembly.yaml\n";

    [Fact]
    public void LoadAssembly_Overlay_ChangesOneValueAndKeepsTheRest()
    {
        using ConfigFolder folder = Samples.Folder().With("variants/v.assembly.yaml", Head + "mounts: { soft: { stiffness: { z: 100 N/mm } } }\n");
        AssemblyDocument assembly = folder.LoadAssembly("variants/v.assembly.yaml").Document!;

        var law = (DirectionalLawDocument)assembly.LawOf("soft").Law;
        Assert.Equal((90e3, 100e3, 0.12), (law.Stiffness[Direction.X].Value, law.Stiffness[Direction.Z].Value, law.LossFactor));
        Assert.Equal("a.assembly.yaml", law.Stiffness[Direction.X].Span.File);
        Assert.Equal("variants/v.assembly.yaml", law.Stiffness[Direction.Z].Span.File);
        Assert.Equal(["a.assembly.yaml"], assembly.Bases.Select(file => file.DisplayPath));
        Assert.Equal("variants/v.assembly.yaml", assembly.Source.DisplayPath);
        Assert.Equal(["soft", "softer", "softest", "tabled", "full"], assembly.Mounts.Select(mount => mount.Name.Value));
    }

    [Fact]
    public void LoadAssembly_Overlay_ResolvesPathsFromTheFileThatNamesThem()
    {
        using ConfigFolder folder = Samples.Folder().With("variants/other.csv", "")
            .With("variants/v.assembly.yaml", Head + "mounts: { tabled: { table: other.csv } }\n");
        AssemblyDocument assembly = folder.LoadAssembly("variants/v.assembly.yaml").Document!;

        Assert.Equal(Path.Combine(folder.Root, "variants", "other.csv"), ((TableLawDocument)assembly.LawOf("tabled").Law).File.FullPath);
        Assert.Equal(Path.Combine(folder.Root, "forces", "2400rpm.csv"), assembly.Operations[0].Forces[0].File.FullPath);
    }

    [Fact]
    public void LoadAssembly_Tilde_RemovesAKey()
    {
        using ConfigFolder folder = Samples.Folder().With("variants/v.assembly.yaml",
            Head + "operations: { shaker check: ~ }\njoints: { front right: { rigid: ~, through: soft } }\nfrequencies: ~\n");
        AssemblyDocument assembly = folder.LoadAssembly("variants/v.assembly.yaml").Document!;

        Assert.Equal(["2400 rpm"], assembly.Operations.Select(operation => operation.Name.Value));
        Assert.Equal("soft", assembly.Joints[1].Mount!.Value);
        Assert.Null(assembly.Frequencies);
    }

    [Fact]
    public void LoadAssembly_ListInOverlay_ReplacesTheList()
    {
        using ConfigFolder folder = Samples.Folder().With("variants/v.assembly.yaml", Head + "joints: { front right: { rigid: [z] } }\n");
        Assert.Equal([Direction.Z], folder.LoadAssembly("variants/v.assembly.yaml").Document!.Joints[1].Rigid.Select(item => item.Value));
    }

    [Fact]
    public void LoadAssembly_OverlayAddsAContradictingKey_ShowsHowToRemoveTheOther()
    {
        using ConfigFolder folder = Samples.Folder().With("variants/v.assembly.yaml", Head + "joints: { front right: { through: soft } }\n");
        Assert.Null(folder.LoadAssembly("variants/v.assembly.yaml").Document);
        Assert.Contains("`rigid: ~`", folder.Diagnostics.Items[0].Helps[0], StringComparison.Ordinal);
    }

    [Fact]
    public void LoadAssembly_ChainOfThree_TakesTheNearestValue()
    {
        using ConfigFolder folder = Samples.Folder()
            .With("variants/v.assembly.yaml", Head + "title: second\njoint_gap: 9 mm\n")
            .With("w.assembly.yaml", "boltup: assembly/1\nbased_on: variants/v.assembly.yaml\ntitle: third\n");
        AssemblyDocument assembly = folder.LoadAssembly("w.assembly.yaml").Document!;

        Assert.Equal(("third", 0.009), (assembly.Title!.Value, assembly.JointGapM));
        Assert.Equal(["variants/v.assembly.yaml", "a.assembly.yaml"], assembly.Bases.Select(file => file.DisplayPath));
    }

    [Fact]
    public void LoadAssembly_CycleOfTwo_NamesTheChain()
    {
        using ConfigFolder folder = new ConfigFolder()
            .With("a.assembly.yaml", "boltup: assembly/1\nbased_on: b.assembly.yaml\n")
            .With("b.assembly.yaml", "boltup: assembly/1\nbased_on: ./a.assembly.yaml\n");
        Assert.Null(folder.LoadAssembly().Document);
        Assert.Equal("CFG060", Assert.Single(folder.Diagnostics.Items).Code.Code);
        Assert.Equal("b.assembly.yaml:2:11", folder.Diagnostics.Items[0].Span!.ToString());
        Assert.Equal(["chain: a.assembly.yaml → b.assembly.yaml"], folder.Diagnostics.Items[0].Notes);
    }

    [Fact]
    public void LoadAssembly_LongChain_IsRefused()
    {
        using var folder = new ConfigFolder { Options = new LoadOptions { MaximumBaseDepth = 3 } };
        for (int i = 0; i < 5; i++)
        {
            folder.With($"{i}.assembly.yaml", $"boltup: assembly/1\nbased_on: {i + 1}.assembly.yaml\n");
        }

        Assert.Null(folder.LoadAssembly("0.assembly.yaml").Document);
        Assert.Equal(("CFG060", "2.assembly.yaml"), (folder.Diagnostics.Items[0].Code.Code, folder.Diagnostics.Items[0].Span!.File));
    }

    [Fact]
    public void LoadAssembly_BaseOfAnotherKind_IsRefused()
    {
        using ConfigFolder folder = Samples.Folder().With("v.assembly.yaml", "boltup: assembly/1\nbased_on: parts/body.part.yaml\n");
        Assert.Null(folder.LoadAssembly("v.assembly.yaml").Document);
        Assert.Equal(("CFG020", "parts/body.part.yaml"), (folder.Diagnostics.Items[0].Code.Code, folder.Diagnostics.Items[0].Span!.File));
    }
}
