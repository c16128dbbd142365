using System.Numerics;
using Boltup.Engine.Acoustics;
using Boltup.Engine.Comparing;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;
using Boltup.Reports.Comparing;
using Boltup.Reports.Results;

namespace Boltup.Reports.Pictures;

/// <summary>The pictures of a comparison: levels before (thin) and after (thick), and their difference below.</summary>
public static class ComparisonPages
{
    /// <summary>Least half height of the panel of differences in dB.</summary>
    private const double SmallestDifference = 3;

    private const double LargestDifference = 30;

    /// <summary>A page for every response and operation that both sides have.</summary>
    /// <param name="provenance">Closes every caption.</param>
    public static IReadOnlyList<Picture> All(ComparedPredictions effect, string provenance) =>
        PictureNames.MakeDistinct([.. effect.Responses.Select((response, i) => Of(effect, response, PictureStyle.LineAt(i), provenance))]);

    private static Picture Of(ComparedPredictions effect, ResponseChange response, Rgb colour, string provenance)
    {
        double[] hz = response.Lines.Hz.ToArray();
        LevelReference reference = ComparisonWords.ReferenceOf(response);
        double[] before = Levels(effect.Base, response, reference), after = Levels(effect.Changed, response, reference);
        double[] difference = [.. after.Zip(before, (one, other) => one - other)];
        var levels = new Panel(
            "",
            PictureAxes.Frequency(response.Lines, ""),
            PictureAxes.Level([before, after], reference, 8),
            [new Series("base", hz, before, PictureStyle.Quiet, Thin: true), new Series("changed", hz, after, colour)],
            (0, 0, 1, 0.65));
        var differences = new Panel(
            "", PictureAxes.Frequency(response.Lines, "Frequency in Hz"), DifferenceAxis(difference), [Zero(hz), new Series("", hz, difference, colour, Thin: true)], (0, 0.65, 1, 0.35));
        return new Picture(
            $"{FileNames.FromName(response.Operation)}-{FileNames.FromName(response.Response)}-compared",
            response.Response,
            $"{response.Operation} · overall {ComparisonWords.Level(response, response.Overall.BasePower)} → {ComparisonWords.Level(response, response.Overall.ChangedPower)} dB "
                + $"({SignedText.Of(response.Overall.Decibels, 1)} dB) re {reference.Text}",
            provenance,
            PictureStyle.PageWidth,
            PictureStyle.PageHeight,
            [levels, differences])
        {
            Legend = [new LegendEntry("base", PictureStyle.Quiet), new LegendEntry("changed", colour)],
        };
    }

    private static Series Zero(double[] hz) => new("", [hz[0], hz[^1]], [0, 0], PictureStyle.Quiet, Thin: true);

    private static double[] Levels(PredictionResult result, ResponseChange response, LevelReference reference)
    {
        OperationResult operation = result.Operations.First(candidate => candidate.Name == response.Operation);
        ResponseSpectrum spectrum = operation.Responses.First(candidate => candidate.Name == response.Response);
        double toRms = operation.Amplitude == Amplitude.Peak ? Math.Sqrt(0.5) : 1;
        return [.. response.Lines.Hz.ToArray().Select(hz =>
        {
            double decibels = reference.Decibels(toRms * Complex.Abs(spectrum.Values[operation.Axis.IndexOf(hz)]));
            return double.IsFinite(decibels) ? decibels : double.NaN;
        })];
    }

    /// <summary>Even about zero.</summary>
    private static PictureAxis DifferenceAxis(double[] difference)
    {
        double largest = difference.Where(double.IsFinite).Select(Math.Abs).DefaultIfEmpty().Max();
        double limit = Math.Clamp(Math.Ceiling(1.1 * largest), SmallestDifference, LargestDifference);
        return new PictureAxis("Change in dB", -limit, limit, false, Ticks.Even(-limit, limit, 5));
    }
}
