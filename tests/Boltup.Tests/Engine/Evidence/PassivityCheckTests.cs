using System.Numerics;
using Boltup.Engine;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Evidence;
using Boltup.Engine.Spectra;
using Boltup.Tests.Support;
using MathNet.Numerics.LinearAlgebra;

namespace Boltup.Tests.Engine.Evidence;

public class PassivityCheckTests
{
    [Fact]
    public void Measure_PassiveLattice_HasNoNegativeEigenvalue()
    {
        Passivity found = PassivityCheck.Measure(Lattice());
        Assert.Equal(5, found.Dofs);
        Assert.All(found.SmallestEigenvalue, value => Assert.InRange(value, -1e-13, 1));
        Assert.Empty(Judge(found));
    }

    [Fact]
    public void Measure_FreeCompressor_IsPassiveToSinglePrecision() =>
        Assert.All(PassivityCheck.Measure(BenchData.FreeCompressor()).SmallestEigenvalue, value => Assert.InRange(value, -1e-4, 1));

    /// <summary>The eigenvalues of an independent library, with the scaling of the definition.</summary>
    [Fact]
    public void Measure_SpoiledMatrix_HasTheEigenvaluesOfTheLibrary()
    {
        FrfMatrix frf = Spoil(Lattice(), 3, 1, -2);
        Passivity found = PassivityCheck.Measure(frf);
        foreach (int line in new[] { 0, 9, 36 })
        {
            var mobility = Matrix<Complex>.Build.Dense(5, 5, (i, j) =>
                Complex.ImaginaryOne * frf[line, i, j] / Math.Sqrt(Complex.Abs(frf[line, i, i]) * Complex.Abs(frf[line, j, j])));
            Matrix<Complex> hermitian = (mobility + mobility.ConjugateTranspose()) / 2;
            Assert.Equal(hermitian.Evd(Symmetricity.Hermitian).EigenValues.Min(value => value.Real), found.SmallestEigenvalue[line], 10);
        }
    }

    /// <summary>Every driving point of it looks right by itself.</summary>
    [Fact]
    public void Judge_OffDiagonalTooLarge_SaysTheFrfsGeneratePower()
    {
        Diagnostic warning = Assert.Single(Judge(PassivityCheck.Measure(Spoil(Lattice(), 3, 1, -2))));
        Assert.Equal(EngineCodes.NotPassive, warning.Code);
        Assert.StartsWith("bench: the FRFs between 5 dofs generate power at ", warning.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Measure_NoDofMeasuredBothWays_IsEmpty()
    {
        Passivity found = PassivityCheck.Measure(InstalledLattice.Frf(InstalledLattice.Receiver, InstalledLattice.Interface));
        Assert.Equal((0, 0), (found.Dofs, found.SmallestEigenvalue.Count));
        Assert.Empty(Judge(found));
    }

    private static FrfMatrix Lattice()
    {
        Dof[] dofs = [.. InstalledLattice.Interface, .. InstalledLattice.Source];
        return InstalledLattice.Frf(dofs, dofs);
    }

    private static FrfMatrix Spoil(FrfMatrix frf, int row, int column, double factor)
    {
        frf.Values.ScatterSpectrum(row, column, [.. frf.Values.GatherSpectrum(row, column).Select(value => factor * value)]);
        return frf;
    }

    private static IReadOnlyList<Diagnostic> Judge(Passivity passivity)
    {
        var diagnostics = new DiagnosticBag();
        PassivityCheck.Judge("bench", null, passivity, diagnostics);
        return diagnostics.Items;
    }
}
