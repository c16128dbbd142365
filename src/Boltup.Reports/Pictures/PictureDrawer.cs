using ScottPlot;
using ScottPlot.TickGenerators;
using SkiaSharp;

namespace Boltup.Reports.Pictures;

/// <summary>Turns pictures into PNG. Equal pictures give equal bytes; may be used by several threads at a time.</summary>
public static class PictureDrawer
{
    private const float HeaderHeight = 78;
    private const float FooterHeight = 34;

    public static byte[] DrawPng(Picture picture)
    {
        _ = PictureFonts.Regular;
        using var bitmap = new SKBitmap(picture.Width, picture.Height, SKColorType.Rgba8888, SKAlphaType.Opaque);
        using var canvas = new SKCanvas(bitmap);
        canvas.Clear(PictureWords.ToSkia(PictureStyle.Paper));
        PictureWords.Draw(canvas, picture);
        foreach (Panel panel in picture.Panels)
        {
            DrawPanel(canvas, panel, AreaOf(panel, picture));
        }

        using SKData png = bitmap.Encode(SKEncodedImageFormat.Png, 100);
        return png.ToArray();
    }

    private static PixelRect AreaOf(Panel panel, Picture picture)
    {
        float width = picture.Width - PictureStyle.Edge;
        float height = picture.Height - HeaderHeight - FooterHeight;
        float left = (float)(PictureStyle.Edge / 2 + panel.Place.Left * width);
        float top = (float)(HeaderHeight + panel.Place.Top * height);
        return new PixelRect(left, left + (float)(panel.Place.Width * width), top + (float)(panel.Place.Height * height), top);
    }

    private static void DrawPanel(SKCanvas canvas, Panel panel, PixelRect area)
    {
        using var plot = new Plot();
        StyleFrame(plot, panel);
        foreach (Bar bar in panel.Bars)
        {
            AddBar(plot, bar, panel.X);
        }

        foreach (Series series in panel.Series)
        {
            AddLine(plot, series, panel.X.IsLogarithmic);
        }

        SetAxis(plot.Axes.Bottom, panel.X);
        SetAxis(plot.Axes.Left, panel.Y);
        plot.Axes.SetLimits(Along(panel.X, panel.X.From), Along(panel.X, panel.X.To), panel.Y.From, panel.Y.To);
        PixelPadding padding = PaddingOf(panel);
        plot.Layout.Fixed(padding);
        if (panel.Marker is { } marker)
        {
            AddMarker(plot, marker, panel);
        }

        // The library clears whatever canvas it is given, so each panel gets its own.
        using var own = new SKBitmap((int)area.Width, (int)area.Height, SKColorType.Rgba8888, SKAlphaType.Opaque);
        using var ownCanvas = new SKCanvas(own);
        plot.Render(ownCanvas, own.Width, own.Height);
        if (panel.Map is { } map)
        {
            var frame = new SKRectI((int)padding.Left, (int)padding.Top, own.Width - (int)padding.Right, own.Height - (int)padding.Bottom);
            MapDrawer.Draw(own, frame, panel.X, map);
        }

        canvas.DrawBitmap(own, MathF.Round(area.Left), MathF.Round(area.Top));
    }

    private static PixelPadding PaddingOf(Panel panel) =>
        new(panel.LeftRoom, 22, panel.X.Label.Length > 0 ? 52 : 30, panel.Title.Length > 0 ? 34 : 10);

    private static void StyleFrame(Plot plot, Panel panel)
    {
        plot.FigureBackground.Color = ToColour(PictureStyle.Paper);
        plot.DataBackground.Color = ToColour(PictureStyle.Paper);
        plot.Axes.Title.Label.Text = panel.Title;
        plot.Axes.Title.Label.FontName = PictureFonts.Family;
        plot.Axes.Title.Label.FontSize = PictureStyle.LabelSize;
        plot.Axes.Title.Label.Bold = true;
        plot.Axes.Title.Label.ForeColor = ToColour(PictureStyle.Text);
        plot.Axes.Title.IsVisible = panel.Title.Length > 0;
        plot.Axes.Right.FrameLineStyle.Width = 0;
        plot.Axes.Top.FrameLineStyle.Width = 0;
        plot.Grid.MajorLineColor = ToColour(PictureStyle.Grid);
        plot.Grid.MinorLineColor = ToColour(PictureStyle.FineGrid);
        plot.Grid.MinorLineWidth = 1;
    }

    private static void SetAxis(IAxis axis, PictureAxis wanted)
    {
        var ticks = new NumericManual([.. wanted.Ticks.Select(tick => new Tick(Along(wanted, tick.At), tick.Label, tick.IsMajor))]);
        axis.TickGenerator = ticks;
        axis.TickLabelStyle.FontName = PictureFonts.Family;
        axis.TickLabelStyle.FontSize = PictureStyle.TickSize;
        axis.TickLabelStyle.ForeColor = ToColour(PictureStyle.Text);
        axis.MajorTickStyle.Color = ToColour(PictureStyle.Quiet);
        axis.MinorTickStyle.Color = ToColour(PictureStyle.Quiet);
        axis.FrameLineStyle.Color = ToColour(PictureStyle.Quiet);
        axis.FrameLineStyle.Width = 1;
        if (axis is ScottPlot.AxisPanels.AxisBase labelled)
        {
            labelled.LabelText = wanted.Label;
            labelled.LabelFontName = PictureFonts.Family;
            labelled.LabelFontSize = PictureStyle.LabelSize;
            labelled.LabelBold = false;
            labelled.LabelFontColor = ToColour(PictureStyle.Text);
        }
    }

    private static void AddLine(Plot plot, Series series, bool isLogarithmic)
    {
        int[] shown = [.. Enumerable.Range(0, series.X.Count).Where(i => !isLogarithmic || series.X[i] > 0)];
        double[] x = [.. shown.Select(i => isLogarithmic ? Math.Log10(series.X[i]) : series.X[i])];
        double[] y = [.. shown.Select(i => series.Y[i])];
        ScottPlot.Plottables.Scatter line = plot.Add.ScatterLine(x, y, ToColour(series.Colour));
        line.LineWidth = series.Thin ? PictureStyle.ComparisonWeight : PictureStyle.PredictionWeight;
    }

    private static void AddBar(Plot plot, Bar bar, PictureAxis x)
    {
        ScottPlot.Plottables.Rectangle rectangle = plot.Add.Rectangle(Along(x, bar.Left), Along(x, bar.Right), bar.Bottom, bar.Top);
        rectangle.FillColor = ToColour(bar.Colour);
        rectangle.LineWidth = 0;
        if (bar.Text.Length > 0)
        {
            ScottPlot.Plottables.Text text = plot.Add.Text(bar.Text, Along(x, bar.Right), (bar.Bottom + bar.Top) / 2);
            text.LabelFontName = PictureFonts.Family;
            text.LabelFontSize = PictureStyle.TickSize;
            text.LabelFontColor = ToColour(PictureStyle.Text);
            text.LabelAlignment = Alignment.MiddleLeft;
            text.OffsetX = 6;
        }
    }

    private static void AddMarker(Plot plot, Marker marker, Panel panel)
    {
        double x = Along(panel.X, marker.X);
        bool isRight = x > (Along(panel.X, panel.X.From) + Along(panel.X, panel.X.To)) / 2;
        ScottPlot.Plottables.Marker point = plot.Add.Marker(x, marker.Y, MarkerShape.OpenCircle, 10, ToColour(PictureStyle.Text));
        point.MarkerLineWidth = 1.5f;
        ScottPlot.Plottables.Text text = plot.Add.Text(marker.Text, x, marker.Y);
        text.LabelFontName = PictureFonts.Family;
        text.LabelFontSize = PictureStyle.TickSize;
        text.LabelFontColor = ToColour(PictureStyle.Text);
        text.LabelAlignment = isRight ? Alignment.LowerRight : Alignment.LowerLeft;
        text.OffsetX = isRight ? -10 : 10;
        text.OffsetY = -4;
        text.LabelBackgroundColor = ToColour(PictureStyle.Paper).WithAlpha(0.85);
    }

    private static double Along(PictureAxis axis, double value) => axis.IsLogarithmic ? Math.Log10(value) : value;

    private static Color ToColour(Rgb colour) => new(colour.Red, colour.Green, colour.Blue);
}
