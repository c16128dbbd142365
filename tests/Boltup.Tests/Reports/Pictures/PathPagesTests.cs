using System.Globalization;
using Boltup.Engine.Paths;
using Boltup.Engine.Prediction;
using Boltup.Reports.Pictures;

namespace Boltup.Tests.Reports.Pictures;

public class PathPagesTests
{
    private static readonly Picture Page = PathPages.Of(TinyPaths.Operation, 0, "caption")!;

    [Fact]
    public void Of_Bars_AreTheLevelsOfTheJointsTheStrongestAtTheTop()
    {
        Bar[] bars = [.. Page.Panels[0].Bars];
        Assert.Equal(TinyPaths.ByJoint.Paths.Select(path => path.Path.Name), Page.Panels[0].Y.Ticks.Select(tick => tick.Label));
        Assert.Equal(10 * Math.Log10(TinyPaths.ByJoint.Paths[0].Power / 1e-12), bars[0].Right, 1e-9);
        Assert.True(bars[0].Bottom > bars[1].Top);
        Assert.StartsWith(bars[0].Right.ToString("F1", CultureInfo.InvariantCulture), bars[0].Text, StringComparison.Ordinal);
    }

    [Fact]
    public void Of_Map_HasTheRowsOfTheBars()
    {
        ColourMap map = Page.Panels[1].Map!;
        Assert.Equal(2, map.Rows.Count);
        Assert.Equal(TinyPaths.Axis.Hz.ToArray(), map.X);
        Assert.InRange(map.Rows.SelectMany(row => row).Max(), map.To - 10, map.To);
    }

    [Fact]
    public void Of_PathThatWorksAgainstTheSum_HasAnotherColour()
    {
        RankedPath[] turned = [.. TinyPaths.ByJoint.Paths.Select((path, i) => path with { Share = i == 0 ? 1.2 : -0.2 })];
        OperationResult operation = TinyPaths.Operation with
        {
            RankedPaths = [TinyPaths.Operation.RankedPaths[1] with { Overall = TinyPaths.ByJoint with { Paths = turned } }],
        };
        Bar[] bars = [.. PathPages.Of(operation, 0, "caption")!.Panels[0].Bars];
        Assert.Equal(Page.Legend[0].Colour, bars[0].Colour);
        Assert.Equal(Page.Legend[1].Colour, bars[1].Colour);
    }

    [Fact]
    public void Of_LongName_KeepsItsDirection()
    {
        RankedPath[] renamed = [TinyPaths.ByJoint.Paths[0] with { Path = new TransferPath(PathKind.Joint, "a mount behind the left front wheel rx") }];
        OperationResult operation = TinyPaths.Operation with
        {
            RankedPaths = [TinyPaths.Operation.RankedPaths[1] with { Overall = TinyPaths.ByJoint with { Paths = renamed } }],
        };
        string label = PathPages.Of(operation, 0, "caption")!.Panels[0].Y.Ticks[0].Label;
        Assert.Equal((22, "a mount behind t…el rx"), (label.Length, label));
    }

    [Fact]
    public void Of_NobodyAskedForPaths_IsNoPage() => Assert.Null(PathPages.Of(TinyResult.Plain.Operations[0], 0, "caption"));

    [Fact]
    public void DrawPng_PathPage_PaintsTheDarkestColourInItsMap()
    {
        using SkiaSharp.SKBitmap bitmap = SkiaSharp.SKBitmap.Decode(PictureDrawer.DrawPng(Page));
        ColourMap map = Page.Panels[1].Map!;
        Rgb strongest = map.ColourOf(map.Rows.SelectMany(row => row).Max());
        Assert.Contains(bitmap.Pixels, pixel => new Rgb(pixel.Red, pixel.Green, pixel.Blue) == strongest);
    }
}
