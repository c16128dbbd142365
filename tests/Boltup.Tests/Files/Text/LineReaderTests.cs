using System.Text;
using Boltup.Files.Text;

namespace Boltup.Tests.Files.Text;

public class LineReaderTests
{
    [Theory]
    [InlineData(1)]
    [InlineData(3)]
    [InlineData(64)]
    [InlineData(1 << 16)]
    public void TryRead_AnyWindow_GivesTheSameLines(int window)
    {
        string[] expected = ["first", "", "second", new string('x', 65_000), "last"];
        using var file = new TemporaryFile($"{expected[0]}\n\r\n{expected[2]}\r{expected[3]}\r\n{expected[4]}");
        using ByteSource source = ByteSource.Open(file.Path);
        var lines = new LineReader(source, window);
        Assert.Equal(expected, All(lines));
        Assert.Equal(5, lines.LineNumber);
        Assert.False(lines.LineIsEnded);
    }

    [Theory]
    [InlineData(1)]
    [InlineData(64)]
    public void MoveTo_BackAndForth_ReadsWhatStandsThere(int window)
    {
        string text = string.Concat(Enumerable.Range(0, 50_000).Select(i => FormattableString.Invariant($"{i:D7}\n")));
        using var file = new TemporaryFile(text);
        using ByteSource source = ByteSource.Open(file.Path);
        var lines = new LineReader(source, window);
        foreach (int line in (int[])[49_999, 0, 1, 30_000, 30_001, 8, 49_999])
        {
            lines.MoveTo(8L * line);
            Assert.True(lines.TryRead(out ReadOnlySpan<byte> found));
            Assert.Equal(line, int.Parse(found, System.Globalization.CultureInfo.InvariantCulture));
            Assert.Equal(8L * line, lines.LineStart);
        }
    }

    [Fact]
    public void TryRead_FileThatBecomesShorter_Ends()
    {
        if (OperatingSystem.IsWindows())
        {
            return; // an open file cannot be cut there
        }

        using var file = new TemporaryFile(string.Concat(Enumerable.Repeat("line\n", 100_000)));
        using ByteSource source = ByteSource.Open(file.Path);
        using (var cut = new FileStream(file.Path, FileMode.Open, FileAccess.Write, FileShare.ReadWrite))
        {
            cut.SetLength(1000);
        }

        var lines = new LineReader(source, 64);
        int count = 0;
        while (count < 1000 && lines.TryRead(out _))
        {
            count++;
        }

        Assert.Equal(200, count);
    }

    private static List<string> All(LineReader lines)
    {
        var all = new List<string>();
        while (lines.TryRead(out ReadOnlySpan<byte> line))
        {
            all.Add(Encoding.ASCII.GetString(line));
        }

        return all;
    }
}
