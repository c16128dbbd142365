using Boltup.Engine;
using Boltup.Engine.Diagnostics;
using Boltup.Reports;
using Boltup.Reports.Diagnostics;

namespace Boltup.Tests.Reports.Diagnostics;

public class ExplainTextTests
{
    [Fact]
    public void Write_CodeThatDataCannotSupport_ReadsAsApproved() =>
        Golden.Check("explain.txt", Explain(EngineCodes.SingularInterface));

    [Fact]
    public void Write_EveryReportCode_FitsEightyColumnsOutsideTheExample() =>
        Assert.All(DiagnosticCode.DeclaredIn(typeof(ReportCodes)), code =>
            Assert.All(Explain(code).Split('\n').Where(line => !line.StartsWith("    ", StringComparison.Ordinal)), line => Assert.InRange(line.Length, 0, 80)));

    private static string Explain(DiagnosticCode code)
    {
        using var text = new StringWriter { NewLine = "\n" };
        ExplainText.Write(text, code, Ink.Plain);
        return text.ToString();
    }
}
