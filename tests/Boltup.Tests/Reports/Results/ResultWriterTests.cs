using Boltup.Engine.Diagnostics;
using Boltup.Engine.Prediction;
using Boltup.Tests.Support;

namespace Boltup.Tests.Reports.Results;

public sealed class ResultWriterTests : IDisposable
{
    private readonly TemporaryFolder _folder = new();
    private readonly DiagnosticBag _diagnostics = new();

    public void Dispose() => _folder.Dispose();

    [Fact]
    public void Write_WithoutPictures_WritesTheDataFiles()
    {
        IReadOnlyList<string>? names = TinyResult.Write(_folder.PathTo("out"), _diagnostics);

        Assert.Equal(["bands.csv", "joint_forces.csv", "levels.csv", "report.html", "responses.csv", "summary.json", "tones.csv"], names);
        Assert.Empty(_diagnostics.Items);
    }

    [Fact]
    public void Write_Twice_GivesTheSameBytes()
    {
        IReadOnlyList<string> names = TinyResult.Write(_folder.PathTo("first"), _diagnostics, pictures: true)!;
        TinyResult.Write(_folder.PathTo("second"), _diagnostics, pictures: true);

        Assert.Contains("idle-ear-left.png", names);
        Assert.All(names, name => Assert.Equal(File.ReadAllBytes(_folder.PathTo($"first/{name}")), File.ReadAllBytes(_folder.PathTo($"second/{name}"))));
    }

    /// <summary>`a b` with `c` and `a` with `b c` would both be `a-b-c`.</summary>
    [Fact]
    public void Write_NamesThatAreSpelledTheSame_GetPicturesOfTheirOwn()
    {
        PredictionResult result = TinyResult.Of(
            TinyResult.Operation("a b", Amplitude.Rms, TinyResult.Seat with { Name = "c" }, TinyResult.Seat with { Name = "joint forces" }),
            TinyResult.Operation("a", Amplitude.Rms, TinyResult.Seat with { Name = "b c" }, TinyResult.Seat with { Name = "d" }));

        IReadOnlyList<string> names = TinyResult.Write(_folder.PathTo("out"), _diagnostics, pictures: true, result)!;

        Assert.Contains("a-b-c.png", names);
        Assert.Contains("a-b-c-2.png", names);
        Assert.Contains("a-b-joint-forces-2.png", names);
        Assert.Equal(7 + 7, names.Count);
    }

    [Fact]
    public void Write_FolderUnderAFile_IsADiagnostic()
    {
        File.WriteAllText(_folder.PathTo("file"), "");

        Assert.Null(TinyResult.Write(_folder.PathTo("file/out"), _diagnostics));
        Assert.True(_diagnostics.HasErrors);
    }
}
