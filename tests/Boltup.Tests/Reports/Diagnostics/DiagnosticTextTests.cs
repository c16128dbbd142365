using Boltup.Engine;
using Boltup.Engine.Diagnostics;
using Boltup.Reports.Diagnostics;
using Boltup.Tests.Support;

namespace Boltup.Tests.Reports.Diagnostics;

public sealed class DiagnosticTextTests : IDisposable
{
    private readonly TemporaryFolder _folder = new();

    public void Dispose() => _folder.Dispose();

    [Fact]
    public void WriteAll_EveryKindOfPlace_ReadsAsApproved()
    {
        string yaml = _folder.PathTo("minibus.assembly.yaml");
        File.WriteAllLines(yaml, ["mounts:", "    front: { stifness: 120 N/mm }", "\trear: \u001b[31m5\t# tab and escape"]);
        var bag = new DiagnosticBag();
        bag.Error(EngineCodes.MissingFrf, "unknown key `stifness`", new SourceSpan(yaml, 2, 14, 8), "did you mean `stiffness`?");
        bag.Warning(EngineCodes.PartNotConnected, "part `rear` is not connected", new SourceSpan(yaml, 3, 2, 4), null, "it takes part in no joint");
        bag.Warning(EngineCodes.PartNotConnected, "the line as a whole", new SourceSpan(yaml, 1));
        bag.Error(EngineCodes.NoCommonAxis, "a file without lines", new SourceSpan("body.unv", ByteOffset: 1234));
        bag.Error(EngineCodes.NoCommonAxis, "a file that is gone", new SourceSpan("gone.yaml", 7, 3, 2));
        bag.Note(EngineCodes.NoCommonAxis, "nowhere in particular", null, "do this", "found that", "expected this");

        Golden.Check("diagnostics.txt", Render(Ink.Plain, bag.Items).Replace(_folder.Path, "configs", StringComparison.Ordinal));
    }

    [Fact]
    public void WriteAll_Coloured_SaysTheSameWords()
    {
        var bag = new DiagnosticBag();
        bag.Error(EngineCodes.NoCommonAxis, "message", new SourceSpan("gone.yaml", 7), "help", "note");
        string coloured = Render(Ink.Coloured, bag.Items);

        Assert.Contains('\u001b', coloured);
        Assert.Equal(Render(Ink.Plain, bag.Items), System.Text.RegularExpressions.Regex.Replace(coloured, "\u001b\\[[0-9;]*m", ""));
    }

    [Fact]
    public void OneLine_WithAndWithoutPlace_IsOneLine()
    {
        var diagnostic = new Diagnostic(EngineCodes.NoCommonAxis, Severity.Error, "no line in common") { Span = new SourceSpan("a.yaml", 3, 5) };

        Assert.Equal("a.yaml:3:5: error[ENG007]: no line in common", DiagnosticText.OneLine(diagnostic));
        Assert.Equal("error[ENG007]: no line in common", DiagnosticText.OneLine(diagnostic with { Span = null }));
    }

    [Theory]
    [InlineData(0, 0, 3, null)]
    [InlineData(1, 0, 0, "1 error")]
    [InlineData(2, 1, 1, "2 errors, 1 warning")]
    [InlineData(0, 2, 0, "2 warnings")]
    public void Count_Diagnostics_CountsErrorsAndWarnings(int errors, int warnings, int notes, string? expected)
    {
        Diagnostic[] all =
        [
            .. Some(errors, Severity.Error),
            .. Some(warnings, Severity.Warning),
            .. Some(notes, Severity.Note),
        ];

        Assert.Equal(expected, DiagnosticText.Count(all));
    }

    private static IEnumerable<Diagnostic> Some(int count, Severity severity) =>
        Enumerable.Repeat(new Diagnostic(EngineCodes.NoCommonAxis, severity, "message"), count);

    private static string Render(Ink ink, IReadOnlyList<Diagnostic> diagnostics)
    {
        using var text = new StringWriter { NewLine = "\n" };
        new DiagnosticText(text, ink).WriteAll(diagnostics);
        return text.ToString();
    }
}
