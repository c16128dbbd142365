using System.Numerics;
using Boltup.Engine.Prediction;
using Boltup.Reports.Pictures;

namespace Boltup.Tests.Reports.Pictures;

public class UnusualPageTests
{
    private static readonly double[] Hz = [50, 100, 200];

    [Fact]
    public void All_WithNamesThatMakeOneFileName_NumbersThem()
    {
        var pages = new PicturePages(TinyPrediction.Of(Hz, [1, 1, 1], null, "joint forces", "!", "?"), "x");

        Assert.Equal(
            ["overview", "2400-rpm-joint-forces", "2400-rpm--", "2400-rpm---2", "2400-rpm-joint-forces-2"],
            pages.All().Select(picture => picture.Name));
    }

    [Fact]
    public void All_WithNamesLongerThanAFileSystemTakes_ShortensThemAndKeepsThemApart()
    {
        string[] responses = [new('ö', 300), new string('ö', 300) + "x"];

        string[] names = [.. new PicturePages(TinyPrediction.Of(Hz, [1, 1, 1], null, responses), "x").All().Select(picture => picture.Name)];

        Assert.Equal(names.Length, names.Distinct().Count());
        Assert.All(names, name => Assert.InRange(System.Text.Encoding.UTF8.GetByteCount(name + ".png"), 1, 255));
    }

    [Theory]
    [InlineData(0, "2400 rpm · overall silent re 20 µPa · body.ear.p")]
    [InlineData(double.NaN, "2400 rpm · overall not known re 20 µPa · body.ear.p")]
    public void Response_WithoutALevel_SaysSoAndPointsAtNothing(double value, string subtitle)
    {
        PredictionResult result = TinyPrediction.Of(Hz, [value, value, value]);

        Picture page = new PicturePages(result, "x").Response(result.Operations[0], 0);

        Assert.Equal(subtitle, page.Subtitle);
        Assert.Null(page.Panels[0].Marker);
        Assert.All(page.Panels.SelectMany(panel => panel.Series).SelectMany(series => series.Y), y => Assert.Equal(double.NaN, y));
        Assert.NotEmpty(PictureDrawer.DrawPng(page));
    }

    [Fact]
    public void Response_WithOneLineWithoutValue_LeavesAGapAndFindsTheStrongestOfTheRest()
    {
        PredictionResult result = TinyPrediction.Of(Hz, [Complex.NaN, 2e-5, 2e-3]);

        Panel panel = new PicturePages(result, "x").Response(result.Operations[0], 0).Panels[0];

        Assert.Equal([double.NaN, 0, 40], panel.Series[0].Y.Select(y => Math.Round(y, 9)));
        Assert.Equal("40.0 dB at 200 Hz", panel.Marker!.Text);
    }
}
