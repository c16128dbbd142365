using System.Globalization;
using Boltup.Config.Documents;
using Boltup.Engine.Geometry;

namespace Boltup.Tests.Config;

public class CultureTests
{
    [Theory]
    [InlineData("de-DE")]
    [InlineData("tr-TR")]
    public void LoadAssembly_CultureWithDecimalComma_ReadsTheSame(string culture)
    {
        CultureInfo before = CultureInfo.CurrentCulture;
        CultureInfo.CurrentCulture = new CultureInfo(culture);
        try
        {
            using ConfigFolder folder = Samples.Folder();
            AssemblyDocument assembly = folder.LoadAssembly().Document!;
            Assert.Equal(new Vector3d(1.2, 0, 0.3), assembly.FindPart("body")!.Moved!.Value);

            folder.With("b.part.yaml", "boltup: part/1\nlumped: { direction: x, masses: { s: 1 kg } }\npoints: { s: { axes: { x: [0, 1.5, 0], y: [1, 0, 0] } } }\n");
            folder.LoadPart("b.part.yaml");
            Assert.Equal("axis `x` has the length 1.5, expected 1", folder.Diagnostics.Items[0].Message);
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }
}
