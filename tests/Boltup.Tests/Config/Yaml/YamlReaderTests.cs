using System.Text;
using Boltup.Config;
using Boltup.Config.Yaml;
using Boltup.Engine.Diagnostics;

namespace Boltup.Tests.Config.Yaml;

public class YamlReaderTests
{
    private static readonly SourceFile File = new("/folder/a.yaml", "a.yaml");

    [Fact]
    public void Read_NestedDocument_KeepsPlacesOfKeysAndValues()
    {
        YamlMap root = Map("a: 1\nb: {c: [x , 'y'], d: }\ne:\n  f: hello world # note\n");

        Assert.Equal(At(1, 1, 1), root.Find("a")!.KeySpan);
        Assert.Equal(At(1, 4, 1), root["a"]!.Span);
        Assert.Equal(At(2, 4, 19), root["b"]!.Span);
        var b = (YamlMap)root["b"]!;
        Assert.Equal(At(2, 8, 9), b["c"]!.Span);
        Assert.Equal(At(2, 13, 3), ((YamlList)b["c"]!).Items[1].Span);
        Assert.False(((YamlScalar)((YamlList)b["c"]!).Items[1]).IsPlain);
        Assert.True(((YamlScalar)b["d"]!).IsEmpty);
        Assert.Equal(At(3, 1, 1), root["e"]!.Span);
        Assert.Equal(At(4, 6, 11), ((YamlMap)root["e"]!)["f"]!.Span);
    }

    [Fact]
    public void Read_WindowsLineEndsAndByteOrderMark_GivesTheSamePlaces()
    {
        byte[] bytes = [0xEF, 0xBB, 0xBF, .. "a: 1\r\nb: 2\r\n"u8];
        var root = (YamlMap)YamlReader.Read(bytes, File, new DiagnosticBag())!;
        Assert.Equal((At(1, 1, 1), At(2, 4, 1)), (root.Find("a")!.KeySpan, root["b"]!.Span));
    }

    [Fact]
    public void Read_SeveralMistakes_ReportsThemAll()
    {
        DiagnosticBag found = Errors("a: &x 1\na: *x\nb: !t 2\n<<: {}\n[c]: 3\n");
        Assert.Equal(["CFG004", "CFG004", "CFG011", "CFG005", "CFG008", "CFG009"], found.Items.Select(item => item.Code.Code));
    }

    [Fact]
    public void Read_BillionLaughs_IsRefusedWithAFewErrors()
    {
        var text = new StringBuilder("a0: &a0 [x, x]\n");
        for (int i = 1; i < 40; i++)
        {
            text.Append(System.Globalization.CultureInfo.InvariantCulture, $"a{i}: &a{i} [*a{i - 1}, *a{i - 1}]\n");
        }

        DiagnosticBag found = Errors(text.ToString());
        Assert.InRange(found.Items.Count, 1, 51);
        Assert.Equal(ConfigCodes.TooLarge, found.Items[^1].Code);
    }

    [Theory]
    [InlineData('[', 100_000)]
    [InlineData('{', 100_000)]
    public void Read_DeepNesting_IsRefused(char bracket, int depth) =>
        Assert.Equal("CFG003", Assert.Single(Errors("a: " + new string(bracket, depth)).Items).Code.Code);

    [Fact]
    public void Read_DeepBlockNesting_IsRefused()
    {
        string text = string.Concat(Enumerable.Range(0, 300).Select(level => new string(' ', level) + "a:\n"));
        Assert.Equal("CFG003", Assert.Single(Errors(text).Items).Code.Code);
    }

    [Fact]
    public void Read_MillionValues_IsRefused() =>
        Assert.Equal("CFG003", Assert.Single(Errors("a: [" + string.Concat(Enumerable.Repeat("a,", 1_000_000)) + "]").Items).Code.Code);

    [Fact]
    public void Read_HugeUnclosedLineWithTrailingBlank_TakesMemoryInProportion()
    {
        const int count = 50_000;
        string text = "a: [" + string.Concat(Enumerable.Repeat("'x', ", count));
        long before = GC.GetAllocatedBytesForCurrentThread();
        Assert.Equal("CFG001", Assert.Single(Errors(text).Items).Code.Code);
        Assert.InRange(GC.GetAllocatedBytesForCurrentThread() - before, 0, 1000L * count);
    }

    [Fact]
    public void Read_InvalidUtf8_NamesByteAndPlace()
    {
        var found = new DiagnosticBag();
        byte[] bytes = [.. "a: 1\nb: µ"u8, 0xB5, .. "m\n"u8];
        Assert.Null(YamlReader.Read(bytes, File, found));
        Assert.Equal(("CFG002", At(2, 5, 1)), (found.Items[0].Code.Code, found.Items[0].Span));
        Assert.Contains("0xB5", found.Items[0].Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Read_Utf16_SaysSo()
    {
        var found = new DiagnosticBag();
        Assert.Null(YamlReader.Read([0xFF, 0xFE, .. Encoding.Unicode.GetBytes("a: 1")], File, found));
        Assert.Contains("UTF-16", found.Items[0].Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Read_TabAfterContentOrInBlankLine_IsAccepted() => Assert.Equal(2, Map("a: 1\t# note\n \t\nb: 2\n").Entries.Count);

    private static SourceSpan At(int line, int column, int length) => new("a.yaml", line, column, length);

    private static YamlMap Map(string text)
    {
        var found = new DiagnosticBag();
        var root = (YamlMap?)YamlReader.Read(Encoding.UTF8.GetBytes(text), File, found);
        Assert.Empty(found.Items);
        return root!;
    }

    private static DiagnosticBag Errors(string text)
    {
        var found = new DiagnosticBag();
        Assert.Null(YamlReader.Read(Encoding.UTF8.GetBytes(text), File, found));
        return found;
    }
}
