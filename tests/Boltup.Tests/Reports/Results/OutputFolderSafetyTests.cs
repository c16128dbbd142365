using Boltup.Reports;
using Boltup.Reports.Results;

namespace Boltup.Tests.Reports.Results;

public sealed class OutputFolderSafetyTests : IDisposable
{
    private readonly ResultsSandbox _box = new();

    public void Dispose() => _box.Dispose();

    [Fact]
    public void Commit_ReplacesEarlierResultsAndLeavesNothingElse()
    {
        _box.Run("old", "a.csv", "gone.csv");

        IReadOnlyList<string>? written = _box.Run("new", "b.csv", "a.csv");

        Assert.Equal(["a.csv", "b.csv"], written);
        Assert.Equal("new", _box.Read("a.csv"));
        Assert.False(File.Exists(Path.Combine(_box.Target, "gone.csv")));
        Assert.Equal("a.csv\nb.csv\n", _box.Read(OutputFolder.Manifest));
        Assert.Equal([OutputFolder.Manifest, "a.csv", "b.csv"], NamesIn(_box.Target));
        Assert.Equal(["out"], _box.EntriesOfRoot);
    }

    [Fact]
    public void Commit_WhenAFileCouldNotBeWritten_SaysSoAndKeepsEarlierResults()
    {
        _box.Run("old", "a.csv");
        using (OutputFolder output = OutputFolder.Prepare(_box.Target, _box.Diagnostics)!)
        {
            output.Write("a.csv", _ => throw new IOException("no space left on device"));

            Assert.Null(output.Commit(_box.Diagnostics));
        }

        var said = Assert.Single(_box.Diagnostics.Items);
        Assert.Equal(ReportCodes.CannotWrite, said.Code);
        Assert.Equal(["no space left on device"], said.Notes);
        Assert.Equal("old", _box.Read("a.csv"));
        Assert.Equal(["out"], _box.EntriesOfRoot);
    }

    [Fact]
    public void Dispose_WithoutCommit_KeepsEarlierResults()
    {
        _box.Run("old", "a.csv");
        using (OutputFolder output = OutputFolder.Prepare(_box.Target, _box.Diagnostics)!)
        {
            output.Write("a.csv", stream => stream.WriteByte((byte)'x'));
        }

        Assert.Equal("old", _box.Read("a.csv"));
        Assert.Equal(["out"], _box.EntriesOfRoot);
    }

    [Fact]
    public void Commit_BesideFilesOfOthers_KeepsThem()
    {
        _box.Place("notes.txt", "mine");
        _box.Place("sub/deep.txt", "mine too");

        _box.Run("first", "a.csv", "gone.csv");
        _box.Run("second", "a.csv");

        Assert.Equal("second", _box.Read("a.csv"));
        Assert.Equal("mine", _box.Read("notes.txt"));
        Assert.Equal("mine too", _box.Read("sub/deep.txt"));
        Assert.Equal([OutputFolder.Manifest, "a.csv", "notes.txt", "sub"], NamesIn(_box.Target));
    }

    [Fact]
    public void For_AFolderWithFilesOfOthers_StagesInsideSoThatTheyNeverMove()
    {
        _box.Run("old", "a.csv");
        using (StagingFolder beside = StagingFolder.For(_box.Target))
        {
            Assert.True(beside.IsBeside);
        }

        _box.Place("notes.txt", "mine");
        using StagingFolder inside = StagingFolder.For(_box.Target);
        Assert.False(inside.IsBeside);
    }

    [Fact]
    public void Commit_WhereAFileOfAnotherHasTheName_RefusesAndTouchesNothing()
    {
        _box.Place("a.csv", "mine");

        Assert.Null(_box.Run("new", "a.csv", "b.csv"));

        Assert.Equal(ReportCodes.ForeignFile, Assert.Single(_box.Diagnostics.Items).Code);
        Assert.Equal("mine", _box.Read("a.csv"));
        Assert.Equal(["a.csv"], NamesIn(_box.Target));
    }

    [Fact]
    public void Replacement_ThatFailsHalfWay_PutsEarlierFilesBack()
    {
        _box.Place("notes.txt", "mine");
        _box.Run("old", "a.csv", "b.csv");
        using (StagingFolder staging = StagingFolder.For(_box.Target))
        {
            staging.Write("a.csv", stream => stream.WriteByte((byte)'x'));

            Assert.Throws<FileNotFoundException>(() => new FileReplacement(staging, _box.Target).Run(["a.csv", "missing.csv"]));
        }

        Assert.Equal("old", _box.Read("a.csv"));
        Assert.Equal("old", _box.Read("b.csv"));
        Assert.Equal([OutputFolder.Manifest, "a.csv", "b.csv", "notes.txt"], NamesIn(_box.Target));
    }

    [Theory]
    [InlineData("out.boltup-new-abcdefgh.xyz")]
    [InlineData("out/.boltup-new-abcdefgh.xyz")]
    public void Prepare_AfterAKilledRun_RemovesOnlyWhatThatRunWrote(string leftover)
    {
        _box.Place($"../{leftover}/a.csv", "half");
        _box.Place($"../{leftover}/precious.txt", "mine");
        _box.Place($"../{leftover}/.boltup-journal", "a.csv\n");

        _box.Run("new", "a.csv");

        Assert.Equal(["precious.txt"], NamesIn(Path.Combine(_box.Root.FullName, leftover)));
        Assert.Equal("new", _box.Read("a.csv"));
    }

    [Fact]
    public void Prepare_WhileAnotherRunWrites_LeavesItsWorkAlone()
    {
        using OutputFolder other = OutputFolder.Prepare(_box.Target, _box.Diagnostics)!;
        other.Write("a.csv", stream => stream.WriteByte((byte)'1'));

        _box.Run("2", "a.csv");
        Assert.Equal("2", _box.Read("a.csv"));

        Assert.NotNull(other.Commit(_box.Diagnostics));
        Assert.Equal("1", _box.Read("a.csv"));
    }

    [Fact]
    public void RemoveOwn_WithAListThatNamesFilesOutside_DeletesNothingOutside()
    {
        _box.Place("../outside.txt", "mine");
        _box.Place(OutputFolder.Manifest, "../outside.txt\nsub\n");
        _box.Place("sub/inner.txt", "mine");

        _box.Run("new", "a.csv");

        Assert.Equal("mine", File.ReadAllText(Path.Combine(_box.Root.FullName, "outside.txt")));
        Assert.Equal("mine", _box.Read("sub/inner.txt"));
    }

    [Fact]
    public void Commit_ThroughALink_KeepsTheLink()
    {
        Directory.CreateDirectory(_box.Target);
        string link = Path.Combine(_box.Root.FullName, "link");
        Directory.CreateSymbolicLink(link, _box.Target);

        _box.Run(link, "new", ["a.csv"]);

        Assert.Equal(_box.Target, new DirectoryInfo(link).LinkTarget);
        Assert.Equal("new", _box.Read("a.csv"));
    }

    [Fact]
    public void Commit_WhereAFileStands_RefusesAndKeepsIt()
    {
        File.WriteAllText(_box.Target, "mine");

        Assert.Null(_box.Run("new", "a.csv"));

        Assert.Equal(ReportCodes.CannotWrite, Assert.Single(_box.Diagnostics.Items).Code);
        Assert.Equal("mine", File.ReadAllText(_box.Target));
        Assert.Equal(["out"], _box.EntriesOfRoot);
    }

    [Fact]
    public void Commit_KeepsThePermissionsOfTheFolder()
    {
        if (OperatingSystem.IsWindows())
        {
            return;
        }

        const UnixFileMode Shared = UnixFileMode.UserRead | UnixFileMode.UserWrite | UnixFileMode.UserExecute | UnixFileMode.GroupRead;
        _box.Run("old", "a.csv");
        File.SetUnixFileMode(_box.Target, Shared);

        _box.Run("new", "a.csv");

        Assert.Equal(Shared, File.GetUnixFileMode(_box.Target));
    }

    [Theory]
    [InlineData("/data/out", "/data/out", true)]
    [InlineData("/data/out", "/data/out/sub", true)]
    [InlineData("/data/out", "/data", false)]
    [InlineData("/data/out", "/data/output", false)]
    public void IsAtOrAbove_ComparesWholeNames(string folder, string path, bool expected) =>
        Assert.Equal(expected, StagingFolder.IsAtOrAbove(folder, path));

    private static string[] NamesIn(string folder) =>
        [.. Directory.EnumerateFileSystemEntries(folder).Select(entry => Path.GetFileName(entry)!).Order(StringComparer.Ordinal)];
}
