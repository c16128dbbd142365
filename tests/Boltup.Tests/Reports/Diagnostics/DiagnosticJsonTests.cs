using System.Text;
using Boltup.Engine;
using Boltup.Engine.Diagnostics;
using Boltup.Reports.Diagnostics;

namespace Boltup.Tests.Reports.Diagnostics;

public class DiagnosticJsonTests
{
    [Fact]
    public void WriteDocument_EveryKindOfPlace_ReadsAsApproved()
    {
        var bag = new DiagnosticBag();
        bag.Error(EngineCodes.MissingFrf, "unknown key `stifness`", new SourceSpan("a.yaml", 2, 14, 8), "did you mean `stiffness`?");
        bag.Warning(EngineCodes.NoCommonAxis, "a file without lines", new SourceSpan("body.unv", ByteOffset: 1234));
        bag.Note(EngineCodes.NoCommonAxis, "20 µPa \"quoted\"", null, null, "found that", "expected this");
        using var bytes = new MemoryStream();
        DiagnosticJson.WriteDocument(bytes, bag.Items);

        Golden.Check("diagnostics.json", Encoding.UTF8.GetString(bytes.ToArray()) + "\n");
    }
}
