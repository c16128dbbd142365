using Boltup.Engine.Diagnostics;
using Boltup.Reports;
using Boltup.Reports.Results;

namespace Boltup.Tests.Reports.Results;

public sealed class OutputFolderTests : IDisposable
{
    private readonly TemporaryFolder _folder = new();
    private readonly DiagnosticBag _diagnostics = new();

    private string Target => _folder["out"];

    public void Dispose() => _folder.Dispose();

    [Fact]
    public void Commit_NewFolder_HoldsTheFilesAndTheirList()
    {
        IReadOnlyList<string>? names = Write(("b.csv", "2"), ("a.csv", "1"));

        Assert.Equal(["a.csv", "b.csv"], names);
        Assert.Equal("1", _folder.Read("out/a.csv"));
        Assert.Equal("a.csv\nb.csv\n", _folder.Read("out/.boltup-files"));
        AssertNothingElse();
    }

    [Fact]
    public void Commit_SecondRun_ReplacesOursAndKeepsForeign()
    {
        Write(("a.csv", "1"), ("old.png", "x"));
        File.WriteAllText(_folder["out/notes.txt"], "mine");
        Directory.CreateDirectory(_folder["out/sub/deeper"]);
        File.WriteAllText(_folder["out/sub/deeper/kept.txt"], "mine too");

        Write(("a.csv", "2"));

        Assert.Equal("2", _folder.Read("out/a.csv"));
        Assert.False(File.Exists(_folder["out/old.png"]));
        Assert.Equal("mine", _folder.Read("out/notes.txt"));
        Assert.Equal("mine too", _folder.Read("out/sub/deeper/kept.txt"));
        AssertNothingElse();
    }

    [Fact]
    public void Commit_ForeignFileOfTheSameName_IsRefused()
    {
        Directory.CreateDirectory(Target);
        File.WriteAllText(_folder["out/a.csv"], "mine");

        IReadOnlyList<string>? names = Write(("a.csv", "1"));

        Assert.Null(names);
        Assert.Equal(ReportCodes.ForeignFile, Assert.Single(_diagnostics.Items).Code);
        Assert.Contains("`a.csv`", _diagnostics.Items[0].Message, StringComparison.Ordinal);
        Assert.Equal("mine", _folder.Read("out/a.csv"));
        AssertNothingElse();
    }

    [Fact]
    public void Dispose_WithoutCommit_LeavesEarlierResults()
    {
        Write(("a.csv", "1"));
        using (OutputFolder unfinished = OutputFolder.Prepare(Target, _diagnostics)!)
        {
            unfinished.Write("a.csv", stream => stream.Write("half"u8));
        }

        Assert.Equal("1", _folder.Read("out/a.csv"));
        AssertNothingElse();
    }

    [Fact]
    public void Commit_DiskRefusedOneFile_LeavesEarlierResultsAndSaysSo()
    {
        Write(("a.csv", "1"));
        using (OutputFolder output = OutputFolder.Prepare(Target, _diagnostics)!)
        {
            output.Write("a.csv", stream => stream.Write("2"u8));
            output.Write("b.csv", _ => throw new IOException("No space left on device"));

            Assert.Null(output.Commit(_diagnostics));
        }

        Diagnostic error = Assert.Single(_diagnostics.Items);
        Assert.Equal(ReportCodes.CannotWrite, error.Code);
        Assert.Contains("No space left on device", error.Notes);
        Assert.Equal("1", _folder.Read("out/a.csv"));
        AssertNothingElse();
    }

    [Fact]
    public void Commit_TargetIsALink_FollowsItAndKeepsIt()
    {
        Directory.CreateDirectory(_folder["real"]);
        File.WriteAllText(_folder["real/notes.txt"], "mine");
        Directory.CreateSymbolicLink(Target, _folder["real"]);

        Write(("a.csv", "1"));

        Assert.Equal("1", _folder.Read("real/a.csv"));
        Assert.Equal("mine", _folder.Read("real/notes.txt"));
        Assert.Equal(_folder["real"], new DirectoryInfo(Target).LinkTarget);
    }

    [Fact]
    public void Commit_TargetIsAFile_IsRefusedAndKept()
    {
        File.WriteAllText(Target, "mine");

        Assert.Null(Write(("a.csv", "1")));
        Assert.Equal(ReportCodes.CannotWrite, Assert.Single(_diagnostics.Items).Code);
        Assert.Equal("mine", File.ReadAllText(Target));
        AssertNothingElse();
    }

    [Fact]
    public void Commit_ListWithAPathOutside_TouchesNothingOutside()
    {
        Directory.CreateDirectory(Target);
        File.WriteAllText(_folder["precious.txt"], "mine");
        File.WriteAllText(_folder["out/.boltup-files"], "../precious.txt\n..\n/etc/hostname\nold.csv\n");
        File.WriteAllText(_folder["out/old.csv"], "0");

        Write(("a.csv", "1"));

        Assert.Equal("mine", _folder.Read("precious.txt"));
        Assert.False(File.Exists(_folder["out/old.csv"]));
    }

    [Fact]
    public void Prepare_LeftoverOfAKilledRun_IsNotTouched()
    {
        string leftover = $"{Target}.boltup-{Environment.ProcessId}";
        Directory.CreateDirectory(leftover);
        File.WriteAllText(Path.Combine(leftover, "notes.txt"), "mine");

        Write(("a.csv", "1"));

        Assert.Equal("1", _folder.Read("out/a.csv"));
        Assert.Equal("mine", File.ReadAllText(Path.Combine(leftover, "notes.txt")));
    }

    [Fact]
    public void Apply_FolderThatCannotBeRenamed_HasItsFilesReplaced()
    {
        Write(("a.csv", "1"), ("old.png", "x"));
        File.WriteAllText(_folder["out/notes.txt"], "mine");
        string staging = Path.Combine(Target, ".staging");
        Directory.CreateDirectory(staging);
        File.WriteAllText(Path.Combine(staging, "a.csv"), "2");
        ResultManifest.Write(staging, ["a.csv"]);

        // A folder cannot change places with one inside it, as little as a mount point can.
        FolderReplacement.Apply(staging, Target, ["a.csv"]);

        Assert.Equal("2", _folder.Read("out/a.csv"));
        Assert.Equal("a.csv\n", _folder.Read("out/.boltup-files"));
        Assert.Equal(["notes.txt"], NamesIn(Target).Except([".boltup-files", "a.csv"]));
    }

    [Fact]
    public void Write_SameNameTwice_IsABug()
    {
        using OutputFolder output = OutputFolder.Prepare(Target, _diagnostics)!;
        output.Write("a.csv", _ => { });

        Assert.Throws<ArgumentException>(() => output.Write("a.csv", _ => { }));
    }

    private static IEnumerable<string> NamesIn(string folder) => Directory.EnumerateFileSystemEntries(folder).Select(path => Path.GetFileName(path)!);

    private IReadOnlyList<string>? Write(params (string Name, string Text)[] files)
    {
        using OutputFolder output = OutputFolder.Prepare(Target, _diagnostics)!;
        foreach ((string name, string text) in files)
        {
            output.Write(name, stream => stream.Write(System.Text.Encoding.UTF8.GetBytes(text)));
        }

        return output.Commit(_diagnostics);
    }

    private void AssertNothingElse() => Assert.Equal(["out"], NamesIn(_folder.Root));
}
