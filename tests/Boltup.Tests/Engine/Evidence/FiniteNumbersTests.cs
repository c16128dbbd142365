using System.Numerics;
using Boltup.Engine;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Evidence;
using Boltup.Engine.Spectra;

namespace Boltup.Tests.Engine.Evidence;

public class FiniteNumbersTests
{
    private static readonly FrequencyAxis Axis = FrequencyAxis.Even(10, 10, 12);

    [Fact]
    public void Check_NanAndInfinityInSpectra_NamesLinesAndDofs()
    {
        Complex[] good = new Complex[12];
        Complex[] bad = new Complex[12];
        bad[2] = new Complex(0, double.NaN);
        bad[11] = double.NegativeInfinity;
        var diagnostics = new DiagnosticBag();
        Assert.False(FiniteNumbers.Check("`2400 rpm`", null, new SpectrumSet(Axis, [Dof.Parse("1.x"), Dof.Parse("2.z")], [good, bad]), diagnostics));
        Diagnostic error = Assert.Single(diagnostics.Items);
        Assert.Equal(EngineCodes.NotFinite, error.Code);
        Assert.Equal("`2400 rpm`: values at 2 of 12 lines are no finite numbers", error.Message);
        Assert.Equal(["at 30 and 120 Hz", "in `2.z`"], error.Notes);
    }

    [Fact]
    public void Check_ManySpoiledFrfs_NamesTheFirst()
    {
        var frf = new FrfMatrix(Axis, [Dof.Parse("1.x"), Dof.Parse("2.x")], [Dof.Parse("a.x"), Dof.Parse("b.x"), Dof.Parse("c.x")]);
        for (int i = 0; i < 6; i++)
        {
            frf.Values.ScatterSpectrum(i / 3, i % 3, [.. Enumerable.Repeat(new Complex(double.NaN, 0), 12)]);
        }

        var diagnostics = new DiagnosticBag();
        Assert.False(FiniteNumbers.Check("bench", null, frf, diagnostics));
        Assert.Equal("in `1.x / a.x`, `1.x / b.x`, `1.x / c.x`, `2.x / a.x`, `2.x / b.x` and 1 more", diagnostics.Items[0].Notes[1]);
    }

    [Fact]
    public void Check_FiniteFrfs_SaysNothing()
    {
        var diagnostics = new DiagnosticBag();
        Assert.True(FiniteNumbers.Check("bench", null, new FrfMatrix(Axis, [Dof.Parse("1.x")], [Dof.Parse("1.x")]), diagnostics));
        Assert.Empty(diagnostics.Items);
    }
}
