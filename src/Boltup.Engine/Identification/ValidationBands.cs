using System.Numerics;
using Boltup.Engine.Acoustics;
using Boltup.Engine.Evidence;

namespace Boltup.Engine.Identification;

/// <summary>Predicted against measured levels in bands.</summary>
public static class ValidationBands
{
    /// <summary>10 lg of predicted over measured power of a dof in a band; NaN where either is zero.</summary>
    public static double Difference(ValidationDof dof, BandSums bands, int band) =>
        Decibel(bands.Sum(band, Powers(dof.Predicted)), bands.Sum(band, Powers(dof.Measured)));

    /// <summary>The mean over dofs of a kind of level: 10 lg of the summed power ratios, each dof relative to its own measurement.</summary>
    public static double Difference(ValidationReport report, BandSums bands, int band)
    {
        double[] ratios = [.. report.Dofs.Select(dof => Difference(dof, bands, band)).Where(double.IsFinite).Select(db => Math.Pow(10, db / 10))];
        return ratios.Length == 0 ? double.NaN : 10 * Math.Log10(ratios.Average());
    }

    /// <summary>The bands with the largest differences, largest first.</summary>
    public static IReadOnlyList<(OctaveBand Band, double DifferenceDb)> Worst(ValidationReport report, int count)
    {
        var bands = new BandSums(report.Axis);
        return [.. bands.Bands
            .Select((band, i) => (Band: band, Db: bands.LinesIn(i) > 0 ? Difference(report, bands, i) : double.NaN))
            .Where(entry => double.IsFinite(entry.Db))
            .OrderByDescending(entry => Math.Abs(entry.Db))
            .Take(count)];
    }

    private static double[] Powers(IReadOnlyList<Complex> values) =>
        [.. values.Select(value => value.Real * value.Real + value.Imaginary * value.Imaginary)];

    private static double Decibel(double predicted, double measured) =>
        predicted > 0 && measured > 0 ? 10 * Math.Log10(predicted / measured) : double.NaN;
}
