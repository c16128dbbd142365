using Boltup.Engine.Diagnostics;
using Boltup.Reports;
using Boltup.Reports.Diagnostics;

namespace Boltup.Tests.Reports.Diagnostics;

public class HostileTextTests
{
    [Fact]
    public void Write_OfTextWithTerminalCommands_ShowsThemAsReplacementCharacters()
    {
        string file = Path.GetTempFileName();
        try
        {
            File.WriteAllText(file, "a: \u001b[2Jgone\u009b\n");
            var diagnostic = new Diagnostic(ReportCodes.CannotWrite, Severity.Error, "bad `\u001b]0;x\u0007`")
            {
                Span = new SourceSpan(file, 1, 4, 4),
                Notes = ["\u001b[1mnote"],
                Helps = ["line\rover"],
            };
            var text = new StringWriter();

            new DiagnosticText(text, Ink.Plain).Write(diagnostic);

            Assert.DoesNotContain(text.ToString(), c => char.IsControl(c) && c is not '\n' and not '\r' || c is '\u001b');
            Assert.Contains("1 | a: \ufffd[2Jgone\ufffd", text.ToString(), StringComparison.Ordinal);
            Assert.Contains("help: line\ufffdover", text.ToString(), StringComparison.Ordinal);
            Assert.EndsWith("bad `\ufffd]0;x\ufffd`", DiagnosticText.OneLine(diagnostic), StringComparison.Ordinal);
        }
        finally
        {
            File.Delete(file);
        }
    }
}
