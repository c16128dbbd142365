using System.Numerics;
using Boltup.Engine.Evidence;
using Boltup.Engine.Spectra;
using Boltup.Tests.Support;

namespace Boltup.Tests.Engine.Evidence;

public class FrfRandomErrorTests
{
    /// <summary>Bendat, Piersol, Random Data: the usual table of γ² and n, recomputed from the formula.</summary>
    [Theory]
    [InlineData(0.8, 75, 0.0408)]
    [InlineData(0.95, 10, 0.0513)]
    [InlineData(0.99, 5, 0.0318)]
    [InlineData(0.9, 10, 0.0745)]
    public void Relative_PublishedCases_HasTheirErrors(double coherence, int averages, double expected) =>
        Assert.Equal(expected, FrfRandomError.Relative(coherence, averages), 4);

    /// <summary>The noise of the reference bench is known: the noisy FRFs less the clean ones.</summary>
    [Fact]
    public void StandardDeviation_ReferenceBench_IsThatOfItsNoiseWithinFivePerCent()
    {
        FrfMatrix clean = Frf("bench_insitu_clean.unv");
        FrfMatrix noisy = Frf("bench_insitu_noisy.unv");
        TiledMatrix deviation = FrfRandomError.StandardDeviation(noisy.Values, Frf("bench_insitu_coherence.unv").Values, 10);
        double found = 0;
        double predicted = 0;
        for (int i = 0; i < clean.Rows.Count * clean.Columns.Count * clean.Axis.Count; i++)
        {
            (int row, int column, int line) = (i / clean.Axis.Count / 12, i / clean.Axis.Count % 12, i % clean.Axis.Count);

            // Receptances grow towards low frequency; as accelerances all lines weigh alike.
            double weight = Math.Pow(clean.Axis.Omega(line), 4);
            found += weight * Math.Pow(Complex.Abs(noisy[line, row, column] - clean[line, row, column]), 2);
            predicted += weight * Math.Pow(Complex.Abs(deviation[line, row, column]), 2);
        }

        Assert.InRange(Math.Sqrt(found / predicted), 0.95, 1.05);
    }

    [Fact]
    public void StandardDeviation_WithoutCoherence_IsInfiniteAndWithFullCoherenceZero()
    {
        var frf = new TiledMatrix(2, 1, 1);
        var coherence = new TiledMatrix(2, 1, 1);
        frf.ScatterSpectrum(0, 0, [new Complex(3, 4), new Complex(3, 4)]);
        coherence.ScatterSpectrum(0, 0, [0, 1]);
        TiledMatrix deviation = FrfRandomError.StandardDeviation(frf, coherence, 5);
        Assert.Equal(double.PositiveInfinity, deviation[0, 0, 0].Real);
        Assert.Equal(Complex.Zero, deviation[1, 0, 0]);
    }

    private static FrfMatrix Frf(string file) => BenchData.Frf(file, [.. BenchData.Indicators, .. BenchData.Validation], BenchData.Interface);
}
