using System.Globalization;
using System.Numerics;
using Boltup.Engine.Acoustics;
using Boltup.Engine.Paths;
using Boltup.Engine.Prediction;
using Boltup.Reports.Results;

namespace Boltup.Reports.Pictures;

/// <summary>
/// The picture of the paths to a response: rows are paths, the strongest at the top; bars give their levels over all lines, and beside them a map
/// shows at which frequencies each of them is strong.
/// </summary>
internal static class PathPages
{
    /// <summary>More rows than these cannot be read.</summary>
    private const int MostRows = 24;

    /// <summary>Range of the bars and of the colours, in dB.</summary>
    private const double BarRange = 40;
    private const double ColourRange = 60;

    private const double Step = 10;

    /// <summary>Room right of the longest bar for its words, as a share of the range.</summary>
    private const double WordRoom = 0.55;

    /// <summary>Letters that fit beside the bars.</summary>
    private const int LongestName = 22;

    private const double BarThickness = 0.36;
    private const int ScaleSteps = 120;

    /// <summary>One page, or null where the response is silent or nobody asked for paths.</summary>
    /// <param name="index">Place of the response.</param>
    /// <param name="caption">Where the picture comes from.</param>
    public static Picture? Of(OperationResult operation, int index, string caption)
    {
        ResponseSpectrum response = operation.Responses[index];
        ResponsePaths? paths = operation.RankedPaths.LastOrDefault(paths => paths.Response == response.Name);
        if (paths is null || paths.Overall.Paths.Count == 0 || !(paths.Overall.Power > 0) || !double.IsFinite(paths.Overall.Power))
        {
            return null;
        }

        RankedPath[] shown = [.. paths.Overall.Paths.Take(MostRows)];
        LevelReference reference = LevelReference.For(response.Quantity, response.Unit);
        ColourMap map = MapOf(operation, index, paths, shown, reference);
        string rest = shown.Length < paths.Overall.Paths.Count ? $" · {shown.Length} of {paths.Overall.Paths.Count}" : "";
        string subject = paths.View == PathView.Joints ? "by joint" : "by force";
        string subtitle = $"{operation.Name} · {subject}{rest} · overall {OverallLevel.Of(response, operation.Axis, operation.Amplitude).Text}"
            + " · in brackets: change of the overall level with this path 6 dB lower";
        return new Picture(
            $"{FileNames.FromName(operation.Name)}-{FileNames.FromName(response.Name)}-paths",
            $"Paths to {response.Name}", subtitle, caption, PictureStyle.PageWidth, PictureStyle.PageHeight,
            [Bars(shown, reference), Map(operation, map), Scale(map, reference)])
        {
            Legend = [new LegendEntry("adds", PictureStyle.LineAt(0)), new LegendEntry("works against the sum", PictureStyle.LineAt(1))],
        };
    }

    private static Panel Bars(RankedPath[] shown, LevelReference reference)
    {
        double to = Step * Math.Ceiling(reference.Decibels(Math.Sqrt(shown[0].Power)) / Step);
        var x = new PictureAxis($"Level of the path in dB re {reference.Text}", to - BarRange, to + WordRoom * BarRange, false, Ticks.Even(to - BarRange, to, 4));
        AxisTick[] names = [.. shown.Select((path, row) => new AxisTick(-row, Short(path.Path.Name)))];
        var y = new PictureAxis("", 0.5 - shown.Length, 0.5, false, names);
        return new Panel("", x, y, [], (0, 0, 0.48, 1))
        {
            LeftRoom = PictureStyle.NameRoom,
            Bars = [.. shown.Select((path, row) => BarOf(path, row, to - BarRange, reference))],
        };
    }

    /// <summary>Long names lose their middle: the direction stands at the end.</summary>
    private static string Short(string name) => name.Length <= LongestName ? name : $"{name[..(LongestName - 6)]}…{name[^5..]}";

    private static Bar BarOf(RankedPath path, int row, double from, LevelReference reference)
    {
        double level = reference.Decibels(Math.Sqrt(path.Power));
        string text = string.Create(CultureInfo.InvariantCulture, $"{level:F1} ({SignedText.Of(path.HalvedChange, 1)})");
        Rgb colour = PictureStyle.LineAt(path.Share < 0 ? 1 : 0);
        return new Bar(from, Math.Max(level, from), -row - BarThickness, -row + BarThickness, colour, double.IsFinite(level) ? text : "silent");
    }

    private static ColourMap MapOf(OperationResult operation, int index, ResponsePaths paths, RankedPath[] shown, LevelReference reference)
    {
        PathSpectra spectra = operation.Paths!.Of(index, paths.View);
        double toRms = Math.Sqrt(spectra.PowerFactor);
        double[][] rows = [.. shown.Select(path => spectra.Contribution(spectra.Paths.TakeWhile(other => other != path.Path).Count())
            .Select(value => reference.Decibels(toRms * Complex.Abs(value))).ToArray())];
        double to = Step * Math.Ceiling(rows.SelectMany(row => row).Where(double.IsFinite).DefaultIfEmpty(0).Max() / Step);
        return new ColourMap(operation.Axis.Hz.ToArray(), rows, to - ColourRange, to);
    }

    private static Panel Map(OperationResult operation, ColourMap map) => new(
        "", PictureAxes.Frequency(operation.Axis, "Frequency in Hz"), new PictureAxis("", 0, 1, false, []), [], (0.48, 0, 0.42, 1))
    {
        LeftRoom = PictureStyle.NoRoom,
        Map = map,
    };

    /// <summary>What the colours mean.</summary>
    private static Panel Scale(ColourMap map, LevelReference reference)
    {
        IReadOnlyList<double>[] steps = [.. Enumerable.Range(0, ScaleSteps).Select(step => (IReadOnlyList<double>)
            [map.To - (step + 0.5) / ScaleSteps * (map.To - map.From)])];
        var x = new PictureAxis(" ", 0, 1, false, []);
        var y = new PictureAxis($"Level per line in dB re {reference.Text}", map.From, map.To, false, Ticks.Even(map.From, map.To, 6));
        return new Panel("", x, y, [], (0.9, 0, 0.1, 1)) { Map = new ColourMap([0.5], steps, map.From, map.To) };
    }
}
