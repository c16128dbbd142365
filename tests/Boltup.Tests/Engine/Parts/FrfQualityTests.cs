using System.Numerics;
using Boltup.Engine;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Parts;
using Boltup.Engine.Spectra;
using Boltup.Tests.Support;

namespace Boltup.Tests.Engine.Parts;

public class FrfQualityTests
{
    private static readonly FrequencyAxis Axis = FrequencyAxis.Even(10, 5, 30);
    private static readonly Dof[] Dofs = [Dof.Parse("1.x"), Dof.Parse("2.x")];

    [Fact]
    public void Check_PassivePart_SaysNothing() => Assert.Empty(Check((_, _, value) => value));

    [Fact]
    public void Check_ConjugatedFrfs_NamesEveryDrivingPoint()
    {
        IReadOnlyList<Diagnostic> found = Check((_, _, value) => Complex.Conjugate(value));
        Assert.Equal(["1.x", "2.x"], found.Where(item => item.Code == EngineCodes.PowerGenerated).Select(item => item.Message.Split('`')[3]));
    }

    [Fact]
    public void Check_FlippedSensor_NamesItsDrivingPointAndPair()
    {
        IReadOnlyList<Diagnostic> found = Check((row, _, value) => row == 1 ? -value : value);
        Assert.Equal("part `part`: the driving point `2.x` generates power at 30 of 30 lines", found[0].Message);
        Assert.Equal(EngineCodes.NotReciprocal, found[1].Code);
        Assert.Contains("`2.x` and `1.x`", found[1].Notes[0], StringComparison.Ordinal);
    }

    [Fact]
    public void Check_AccelerancesTakenForReceptances_NamesDrivingPoints() =>
        Assert.All(Check((_, _, value) => -value), item => Assert.Equal(EngineCodes.PowerGenerated, item.Code));

    /// <summary>Rows and columns of a bench need be neither the same dofs nor in one order.</summary>
    [Fact]
    public void Measure_RowsAndColumnsThatDiffer_ComparesTheDofsInBoth()
    {
        PlacedPart part = Chain.Part("p", [1, 2, 3], [1e5, 2e5], 0.1);
        FrfMatrix frf = part.Model.Evaluate(
            Axis, [Dof.Parse("3.x"), Dof.Parse("2.x"), Dof.Parse("1.x")], [Dof.Parse("1.x"), Dof.Parse("2.x")], new DiagnosticBag())!;
        frf.Values.ScatterSpectrum(2, 1, [.. frf.Values.GatherSpectrum(2, 1).Select(value => 3 * value)]);
        FrfQualityReport report = FrfQuality.Measure(frf);
        Assert.Equal([("1.x", 0.0), ("2.x", 0.0)], report.DrivingPoints.Select(point => (point.Dof, point.GeneratedShare)));
        ReciprocityPair pair = Assert.Single(report.Pairs);
        Assert.Equal(("2.x", "1.x"), (pair.First, pair.Second));
        Assert.Equal(0.5, pair.Asymmetry, 12);
    }

    private static IReadOnlyList<Diagnostic> Check(Func<int, int, Complex, Complex> spoil)
    {
        TiledMatrix frf = Chain.Part("p", [1, 2], [1e5], 0.1).Model.Evaluate(Axis, Dofs, Dofs, new DiagnosticBag())!.Values;
        for (int i = 0; i < 4; i++)
        {
            (int row, int column) = (i / 2, i % 2);
            frf.ScatterSpectrum(row, column, [.. frf.GatherSpectrum(row, column).Select(value => spoil(row, column, value))]);
        }

        var diagnostics = new DiagnosticBag();
        FrfQuality.Check("part", null, Axis, [.. Dofs.Select(DofCombination.Own)], frf, diagnostics);
        return diagnostics.Items;
    }
}
