using System.Globalization;
using Boltup.Engine.VirtualPoints;

namespace Boltup.Reports.Pictures;

/// <summary>The picture of virtual points: how rigid the pieces around them are over frequency.</summary>
public static class VirtualPointPage
{
    /// <param name="qualities">At least one; sensors are drawn thick, impacts thin.</param>
    public static Picture Of(IReadOnlyList<VirtualPointQuality> qualities, string caption)
    {
        string[] points = [.. qualities.Select(quality => quality.Point).Distinct()];
        Series[] lines = [.. qualities.Select(quality => new Series(
            "", quality.Axis.Hz.ToArray(), quality.PerLine, PictureStyle.LineAt(Array.IndexOf(points, quality.Point)), Thin: quality.OfImpacts))];
        double least = qualities.SelectMany(quality => quality.PerLine).Where(double.IsFinite).DefaultIfEmpty(0).Min();
        double from = Math.Floor(Math.Clamp(least, 0, 0.8) * 10) / 10;
        string worst = string.Join(", ", qualities.OrderBy(quality => quality.Overall).Take(2).Select(quality => string.Create(
            CultureInfo.InvariantCulture, $"{quality.Point} {(quality.OfImpacts ? "impacts" : "sensors")} {quality.Overall:F3}")));
        return new Picture(
            "virtual-points",
            "How rigid are the virtual points?",
            $"sensors thick, impacts thin · lowest over all lines: {worst}{(qualities.Any(quality => quality.IsExactlyDetermined) ? " · six channels prove nothing" : "")}",
            caption,
            PictureStyle.PageWidth,
            PictureStyle.PageHeight,
            [
                new Panel("", PictureAxes.Frequency(qualities[0].Axis, "Frequency in Hz"),
                    new PictureAxis("Consistency with a rigid piece", from, 1.02, false, Ticks.Even(from, 1, 5)), lines, (0, 0, 1, 1)),
            ])
        {
            Legend = [.. points.Select((point, i) => new LegendEntry(point, PictureStyle.LineAt(i)))],
        };
    }
}
