using System.Numerics;
using Boltup.Engine.Comparing;
using Boltup.Engine.Diagnostics;
using Boltup.Reports.Pictures;
using Boltup.Tests.Engine.Sensitivity;

namespace Boltup.Tests.Reports.Pictures;

public class ComparisonPagesTests
{
    [Fact]
    public void All_EveryResponse_ShowsBaseThinChangedThickAndTheirDifference()
    {
        ComparedPredictions effect = AssemblyComparer.Compare(
            Triaxial.Of(), Triaxial.Of(Triaxial.Matrix()), new DiagnosticBag())!;
        IReadOnlyList<Picture> pages = ComparisonPages.All(effect, "provenance");
        Assert.Equal(["run-far-compared", "run-near-compared"], pages.Select(page => page.Name));
        Panel levels = pages[0].Panels[0], differences = pages[0].Panels[1];
        Assert.Equal([("base", true), ("changed", false)], levels.Series.Select(line => (line.Name, line.Thin)));
        for (int line = 0; line < Triaxial.Axis.Count; line++)
        {
            double before = 20 * Math.Log10(Complex.Abs(effect.Base.Operations[0].Responses[0].Values[line]) / 1e-6);
            Assert.Equal(before, levels.Series[0].Y[line], 1e-9);
            Assert.Equal(levels.Series[1].Y[line] - before, differences.Series[1].Y[line], 1e-9);
        }

        Assert.Equal(-differences.Y.From, differences.Y.To);
        Assert.Equal("Change in dB", differences.Y.Label);
    }
}
