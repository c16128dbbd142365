using Boltup.Config.Pinning;
using Boltup.Config.Planning;
using Boltup.Engine.Diagnostics;

namespace Boltup.Tests.Config.Pinning;

public class PinsFileTests
{
    private const string Assembly = """
        boltup: assembly/1
        frequencies: { from: 10 Hz, to: 20 Hz, step: 10 Hz }
        parts: { a: a.part.yaml }
        mounts:
          m: { table: data/table.csv }
        joints:
          j: { between: [a.n, ground], through: m }
        operations:
          run: { amplitude: rms, applied_forces: { file: data/f.csv, part: a } }
        responses: { r: { at: a.m.x } }
        """;

    private const string Forces = "dof,frequency_hz,real,imag\nm.x,10,1,0\nm.x,20,1,0\n";

    /// <summary>SHA-256 of <see cref="Forces"/>, by sha256sum of GNU coreutils.</summary>
    private const string ForcesDigest = "56e752a95cf720dfb1e1bfe2e16a6c1078b6048d6ac89df06f9f3663b03e3de8";

    [Fact]
    public void Write_WithoutPins_ListsTheDataFilesSorted()
    {
        using ConfigFolder folder = Folder();
        PinChange? change = Write(folder);
        Assert.Equal(["data/f.csv", "data/table.csv"], change!.Added);
        string[] lines = File.ReadAllLines(Path.Combine(folder.Root, "a.pins.yaml"));
        Assert.Equal(["boltup: pins/1", "assembly: \"a.assembly.yaml\"", "files:"], lines[..3]);
        Assert.Equal($"  - {{ file: \"data/f.csv\", sha256: \"{ForcesDigest}\" }}", lines[3]);
        Assert.StartsWith("  - { file: \"data/table.csv\", sha256: ", lines[4], StringComparison.Ordinal);
        Assert.Equal(5, lines.Length);
    }

    [Fact]
    public void Plan_KeptPins_SaysNothing()
    {
        using ConfigFolder folder = Folder();
        Write(folder);
        Assert.True(Plans(folder));
        Assert.Empty(folder.Diagnostics.Items);
    }

    [Fact]
    public void Plan_ChangedDataFile_IsAnErrorThatNamesIt()
    {
        using ConfigFolder folder = Folder();
        Write(folder);
        folder.With("data/f.csv", Forces.Replace("1,0", "2,0", StringComparison.Ordinal));
        Assert.False(Plans(folder));
        Diagnostic item = Assert.Single(folder.Diagnostics.Items);
        Assert.Equal("PLN090", item.Code.Code);
        Assert.Equal("`data/f.csv` changed since it was pinned", item.Message);
        Assert.Equal(("a.pins.yaml", 4), (item.Span!.File, item.Span.Line));
        Assert.Equal($"pinned: {ForcesDigest}", item.Notes[0]);
    }

    [Fact]
    public void Plan_FileThatIsNotPinned_IsAnError()
    {
        using ConfigFolder folder = Folder();
        Write(folder);
        folder.With("data/g.csv", Forces).With("a.assembly.yaml", Assembly.Replace("data/f.csv", "data/g.csv", StringComparison.Ordinal));
        Assert.False(Plans(folder));
        Assert.Equal(["PLN092", "PLN091"], folder.Diagnostics.Items.Select(item => item.Code.Code));
    }

    [Fact]
    public void Plan_PinsOfAnotherAssembly_AreRefused()
    {
        using ConfigFolder folder = Folder();
        Write(folder);
        File.Copy(Path.Combine(folder.Root, "a.assembly.yaml"), Path.Combine(folder.Root, "b.assembly.yaml"));
        File.Copy(Path.Combine(folder.Root, "a.pins.yaml"), Path.Combine(folder.Root, "b.pins.yaml"));
        Assert.False(Plans(folder, "b.assembly.yaml"));
        Assert.Equal("PLN095", Assert.Single(folder.Diagnostics.Items).Code.Code);
    }

    [Fact]
    public void Plan_ShortDigest_IsRefused()
    {
        using ConfigFolder folder = Folder();
        folder.With("a.pins.yaml", "boltup: pins/1\nassembly: a.assembly.yaml\nfiles: [ { file: data/f.csv, sha256: 3f2a } ]\n");
        Assert.False(Plans(folder));
        Assert.Equal("CFG120", Assert.Single(folder.Diagnostics.Items).Code.Code);
    }

    [Fact]
    public void Plan_OverlayOnAPinnedBase_ChecksTheFilesOfTheBase()
    {
        using ConfigFolder folder = Folder();
        Write(folder);
        folder.With("over.assembly.yaml", "boltup: assembly/1\nbased_on: a.assembly.yaml\nmounts: { m: { table: ~, stiffness: { x: 1 N/mm } } }\n");
        Assert.True(Plans(folder, "over.assembly.yaml"));
        Assert.Empty(folder.Diagnostics.Items);
        folder.With("data/f.csv", Forces + "\n");
        Assert.False(Plans(folder, "over.assembly.yaml"));
        Assert.Equal("PLN090", Assert.Single(folder.Diagnostics.Items).Code.Code);
    }

    [Fact]
    public void Write_ChangedFile_NeedsToBeAccepted()
    {
        using ConfigFolder folder = Folder();
        Write(folder);
        string before = File.ReadAllText(Path.Combine(folder.Root, "a.pins.yaml"));
        folder.With("data/f.csv", Forces.Replace("1,0", "2,0", StringComparison.Ordinal));
        Assert.Null(Write(folder));
        Assert.Equal("PLN093", Assert.Single(folder.Diagnostics.Items).Code.Code);
        Assert.Equal(before, File.ReadAllText(Path.Combine(folder.Root, "a.pins.yaml")));
        PinChange? accepted = PinsFile.Write(
            "a.assembly.yaml", accept: true, folder.Options with { WorkingDirectory = folder.Root }, new DiagnosticBag());
        Assert.Equal(["data/f.csv"], accepted!.Changed);
        Assert.Contains(
            "sha256: \"de491419f8d8d27d2625b593243a35623b57ee30cacc54356925cd61da5cf8f9\"", File.ReadAllText(Path.Combine(folder.Root, "a.pins.yaml")), StringComparison.Ordinal);
    }

    [Fact]
    public void Write_Unchanged_LeavesTheFileAlone()
    {
        using ConfigFolder folder = Folder();
        Write(folder);
        string path = Path.Combine(folder.Root, "a.pins.yaml");
        string byHand = File.ReadAllText(path) + "# looked at\n";
        File.WriteAllText(path, byHand);
        Assert.True(Write(folder)!.IsNone);
        Assert.Equal(byHand, File.ReadAllText(path));
    }

    private static ConfigFolder Folder() => new ConfigFolder()
        .With("a.assembly.yaml", Assembly)
        .With("a.part.yaml", "boltup: part/1\nlumped: { direction: x, masses: { m: 1 kg, n: 2 kg }, links: [{ between: [m, n], stiffness: 5 N/mm, loss_factor: 0.1 }] }\n")
        .With("data/f.csv", Forces)
        .With("data/table.csv", "direction,frequency_hz,real,imag\nx,10,1000,10\nx,20,1000,10\n");

    private static PinChange? Write(ConfigFolder folder) =>
        PinsFile.Write("a.assembly.yaml", accept: false, folder.Options with { WorkingDirectory = folder.Root }, folder.Diagnostics);

    private static bool Plans(ConfigFolder folder, string name = "a.assembly.yaml")
    {
        using AssemblyPlan? plan = AssemblyPlanner.Plan(name, folder.Options with { WorkingDirectory = folder.Root }, folder.Diagnostics);
        return plan is not null;
    }
}
