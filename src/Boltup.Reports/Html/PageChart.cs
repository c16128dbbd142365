using System.Numerics;
using Boltup.Engine.Acoustics;
using Boltup.Engine.Prediction;
using Boltup.Reports.Results;

namespace Boltup.Reports.Html;

/// <summary>The spectra of one response in every operation.</summary>
/// <param name="Reference">What 0 dB is, as labels write it.</param>
public sealed record PageChart(string Response, string Dof, string Reference, IReadOnlyList<PageLine> Lines)
{
    internal static IReadOnlyList<PageChart> Of(PredictionResult result) =>
        [.. result.Operations
            .SelectMany((operation, place) => operation.Responses.Select(response => (operation, place, response)))
            .GroupBy(entry => (entry.response.Name, entry.response.Dof))
            .Select(group => Of([.. group]))];

    private static PageChart Of((OperationResult Operation, int Place, ResponseSpectrum Response)[] entries)
    {
        ResponseSpectrum first = entries[0].Response;
        LevelReference reference = LevelReference.For(first.Quantity, first.Unit);
        return new PageChart(
            first.Name,
            first.Dof,
            reference.Text,
            [.. entries.Select(entry => new PageLine(entry.Operation.Name, entry.Place, Levels(entry.Response, entry.Operation.Amplitude, reference)))]);
    }

    /// <summary>Single precision is far finer than a pixel; a line without a level is NaN and becomes a gap.</summary>
    private static float[] Levels(ResponseSpectrum response, Amplitude amplitude, LevelReference reference)
    {
        double toRms = amplitude == Amplitude.Peak ? Math.Sqrt(0.5) : 1;
        double[] decibels = [.. response.Values.Select(value => reference.Decibels(toRms * Complex.Abs(value)))];
        return [.. decibels.Select(value => double.IsFinite(value) ? (float)value : float.NaN)];
    }
}
