using Boltup.Config.Comparing;
using Boltup.Engine.Comparing;

namespace Boltup.Tests.Config.Comparing;

public class AssemblyDifferencesTests
{
    private const string Assembly = """
        boltup: assembly/1
        title: base
        frequencies: { from: 10 Hz, to: 20 Hz, step: 10 Hz }
        parts:
          a: a.part.yaml
          b: { file: b.part.yaml, moved: [1 m, 0 m, 0 m] }
        mounts:
          rear: { stiffness: { x: 90 N/mm, z: 420 N/mm }, loss_factor: 0.1 }
          full: { stiffness_matrix: [[1 N/mm, 0, 0], [0, 2 N/mm, 0], [0, 0, 3 N/mm]] }
          tabled: { table: table.csv }
        joints:
          j: { between: [a.m, b.m], through: rear }
          k: { between: [a.n, b.n], rigid: [x, y] }
        operations:
          run: { amplitude: rms, applied_forces: { file: f.csv, part: a } }
        responses:
          r: { at: b.n.x }
          s: { at: b.m.x }
        targets:
          t: { response: r, limit: 80 dB }
        """;

    private const string Part = "boltup: part/1\nlumped: { direction: x, masses: { m: 1 kg, n: 2 kg }, links: [{ between: [m, n], stiffness: 5 N/mm, loss_factor: 0.1 }, { between: [n, ground], stiffness: 1 N/mm }] }\n";
    private const string Forces = "dof,frequency_hz,real,imag\nm.x,10,1,0\nm.x,20,1,0\n";
    private const string Table = "direction,frequency_hz,real,imag\nx,10,1000,10\nx,20,1000,10\n";

    [Fact]
    public void Of_ChangedStiffness_SaysFromWhatToWhatAndByHowMuch()
    {
        InputDifference difference = Single("z: 420 N/mm", "z: 300 N/mm");
        Assert.Equal(("mounts.rear.stiffness.z", "420 N/mm", "300 N/mm"), (difference.Path, difference.Before, difference.After));
        Assert.Equal(-0.285714, difference.Relative!.Value, 1e-6);
        Assert.Equal(("b/x.assembly.yaml", 8), (difference.Span!.File, difference.Span.Line));
    }

    [Theory]
    [InlineData("z: 420 N/mm", "z: 0.42 kN/mm")]
    [InlineData("z: 420 N/mm", "z: 4.2e5 N/m")]
    [InlineData("{ x: 90 N/mm, z: 420 N/mm }", "{ z: 420 N/mm, x: 90 N/mm, y: 0 N/mm }")]
    [InlineData("loss_factor: 0.1 }", "loss_factor: 1e-1 }")]
    [InlineData("title: base", "# a comment\ntitle: 'base'")]
    [InlineData("a: a.part.yaml", "a: { file: ./a.part.yaml }")]
    [InlineData("rigid: [x, y]", "rigid: [y, x]")]
    [InlineData("applied_forces: { file: f.csv, part: a }", "sum: phase, applied_forces: [{ part: a, file: f.csv }]")]
    [InlineData("r: { at: b.n.x }", "r: { at: b.n.x, as: acceleration }")]
    [InlineData("moved: [1 m, 0 m, 0 m]", "moved: [1000 mm, 0 mm, 0 cm]")]
    [InlineData("[0, 2 N/mm, 0]", "[0 N/mm, 2 kN/m, 0]")]
    [InlineData("limit: 80 dB", "weighting: Z, limit: 80.0 dB")]
    [InlineData("targets:", "joint_gap: 0.5 cm\ntargets:")]
    public void Of_CosmeticEdit_IsNoDifference(string before, string after) => Assert.Empty(Differences(before, after).Items);

    [Theory]
    [InlineData("loss_factor: 0.1 }", "loss_factor: 0.2 }", "mounts.rear.loss_factor", "0.1", "0.2")]
    [InlineData(", loss_factor: 0.1 }", " }", "mounts.rear.loss_factor", "0.1", "0")]
    [InlineData("through: rear", "through: full", "joints.j.through", "rear", "full")]
    [InlineData("rigid: [x, y]", "rigid: [x]", "joints.k.rigid", "[x, y]", "[x]")]
    [InlineData("between: [a.m, b.m]", "between: [a.n, b.m]", "joints.j.between", "[a.m, b.m]", "[a.n, b.m]")]
    [InlineData("moved: [1 m, 0 m, 0 m]", "moved: [2 m, 0 m, 0 m]", "parts.b.moved", "[1 m, 0 m, 0 m]", "[2 m, 0 m, 0 m]")]
    [InlineData("[0, 2 N/mm, 0]", "[0, 4 N/mm, 0]", "mounts.full.stiffness_matrix[2,2]", "2 N/mm", "4 N/mm")]
    [InlineData("r: { at: b.n.x }", "r: { at: b.n.x, as: velocity }", "responses.r.as", "acceleration", "velocity")]
    [InlineData("amplitude: rms", "amplitude: peak", "operations.run.amplitude", "rms", "peak")]
    [InlineData("limit: 80 dB", "limit: 75 dB", "targets.t.limit", "80 dB", "75 dB")]
    public void Of_ChangedValue_NamesItsKey(string before, string after, string path, string from, string to)
    {
        InputDifference difference = Single(before, after);
        Assert.Equal((path, from, to), (difference.Path, difference.Before, difference.After));
        Assert.Equal(InputDifferenceKind.Changed, difference.Kind);
    }

    [Fact]
    public void Of_Level_HasNoRelativeChange() => Assert.Null(Single("limit: 80 dB", "limit: 75 dB").Relative);

    [Fact]
    public void Of_AddedAndRemovedNames_AreSaid()
    {
        IReadOnlyList<InputDifference> items = Differences("  s: { at: b.m.x }", "  u: { at: a.m.x }").Items;
        Assert.Equal([("responses.s", InputDifferenceKind.Removed), ("responses.u", InputDifferenceKind.Added)], items.Select(item => (item.Path, item.Kind)));
        Assert.Equal("{ at: a.m.x }", items[1].After);
    }

    [Fact]
    public void Of_Title_IsARemarkThatMattersToNoResult()
    {
        AssemblyDifferences differences = Differences("title: base", "title: changed");
        Assert.True(Assert.Single(differences.Items).IsRemark);
        Assert.False(differences.MatterToResults);
    }

    [Fact]
    public void Of_ChangedDataFile_IsComparedByContent()
    {
        using ConfigFolder folder = Folder(Assembly).With("b/f.csv", Forces.Replace("1,0", "2,0", StringComparison.Ordinal));
        InputDifference difference = Assert.Single(Compare(folder).Items);
        Assert.Equal(("operations.run.applied_forces.file", InputDifferenceKind.Content), (difference.Path, difference.Kind));
        Assert.Matches(@"^f\.csv \([0-9a-f]{8}\)$", difference.Before);
        Assert.NotEqual(difference.Before, difference.After);
    }

    [Fact]
    public void Of_RenamedDataFileOfTheSameContent_IsNoDifference()
    {
        using ConfigFolder folder = Folder(Assembly.Replace("f.csv", "g.csv", StringComparison.Ordinal)).With("b/g.csv", Forces);
        Assert.Empty(Compare(folder).Items);
    }

    [Fact]
    public void Of_ChangedPartDocument_IsReadThrough()
    {
        using ConfigFolder folder = Folder(Assembly).With("b/b.part.yaml", Part.Replace("n: 2 kg", "n: 2500 g", StringComparison.Ordinal));
        AssemblyDifferences differences = Compare(folder);
        InputDifference difference = Assert.Single(differences.Items);
        Assert.Equal(("parts.b.lumped.masses.n", 0.25), (difference.Path, difference.Relative));
        Assert.True(differences.LeavePart("a"));
        Assert.False(differences.LeavePart("b"));
    }

    [Fact]
    public void Of_ReorderedLinks_IsNoDifferenceAndAChangedOneIsNamed()
    {
        const string reordered = "boltup: part/1\nlumped: { direction: x, masses: { m: 1 kg, n: 2 kg }, links: [{ between: [n, ground], stiffness: 1 N/mm }, { between: [m, n], stiffness: 5 N/mm, loss_factor: 0.1 }] }\n";
        using ConfigFolder folder = Folder(Assembly).With("b/a.part.yaml", reordered);
        Assert.Empty(Compare(folder).Items);
        folder.With("b/a.part.yaml", reordered.Replace("stiffness: 5", "stiffness: 6", StringComparison.Ordinal));
        Assert.Equal("parts.a.lumped.links[1].stiffness", Assert.Single(Compare(folder).Items).Path);
    }

    [Fact]
    public void Of_OverlayThatSaysTheSame_IsNoDifference()
    {
        using ConfigFolder folder = Folder("boltup: assembly/1\nbased_on: ../a/x.assembly.yaml\nmounts: { rear: { loss_factor: 0.10 } }\n");
        Assert.Empty(Compare(folder).Items);
    }

    [Fact]
    public void Of_Overlay_ListsWhatItChanges()
    {
        using ConfigFolder folder = Folder("boltup: assembly/1\nbased_on: ../a/x.assembly.yaml\nmounts: { rear: { stiffness: { z: 300 N/mm } } }\n");
        Assert.Equal("mounts.rear.stiffness.z", Assert.Single(Compare(folder).Items).Path);
    }

    private static InputDifference Single(string before, string after) => Assert.Single(Differences(before, after).Items);

    private static AssemblyDifferences Differences(string before, string after)
    {
        Assert.Contains(before, Assembly, StringComparison.Ordinal);
        using ConfigFolder folder = Folder(Assembly.Replace(before, after, StringComparison.Ordinal));
        return Compare(folder);
    }

    /// <summary>The base in the folder a, the changed assembly in b.</summary>
    private static ConfigFolder Folder(string changed)
    {
        var folder = new ConfigFolder();
        Directory.CreateDirectory(Path.Combine(folder.Root, ".git"));
        foreach ((string name, string assembly) in new[] { ("a", Assembly), ("b", changed) })
        {
            folder.With($"{name}/x.assembly.yaml", assembly).With($"{name}/a.part.yaml", Part).With($"{name}/b.part.yaml", Part)
                .With($"{name}/f.csv", Forces).With($"{name}/table.csv", Table);
        }

        return folder;
    }

    private static AssemblyDifferences Compare(ConfigFolder folder)
    {
        var before = folder.LoadAssembly("a/x.assembly.yaml").Document;
        var changed = folder.LoadAssembly("b/x.assembly.yaml").Document;
        Assert.True(before is not null && changed is not null, string.Join("\n", folder.Diagnostics.Items.Select(item => $"{item.Span}: {item.Message}")));
        return AssemblyDifferences.Of(before, changed);
    }
}
