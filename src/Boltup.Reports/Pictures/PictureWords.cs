using SkiaSharp;

namespace Boltup.Reports.Pictures;

/// <summary>Draws what stands around the diagrams: title, subtitle, legend and caption.</summary>
internal static class PictureWords
{
    private const float TitleBase = 40;
    private const float SubtitleBase = 66;
    private const float CaptionBase = 13;
    private const float SwatchWidth = 24;
    private const float SwatchGap = 7;
    private const float EntryGap = 22;

    public static void Draw(SKCanvas canvas, Picture picture)
    {
        float width = picture.Width - 2 * PictureStyle.Edge;
        using SKFont title = FontOf(PictureFonts.Strong, PictureStyle.TitleSize);
        using SKFont subtitle = FontOf(PictureFonts.Regular, PictureStyle.SubtitleSize);
        using SKFont caption = FontOf(PictureFonts.Regular, PictureStyle.CaptionSize);
        float legend = DrawLegend(canvas, picture);
        DrawText(canvas, Fit(picture.Title, title, width), TitleBase, title, PictureStyle.Text);
        DrawText(canvas, Fit(picture.Subtitle, subtitle, width - legend), SubtitleBase, subtitle, PictureStyle.Quiet);
        DrawText(canvas, Fit(picture.Caption, caption, width), picture.Height - CaptionBase, caption, PictureStyle.Quiet);
    }

    public static SKColor ToSkia(Rgb colour) => new(colour.Red, colour.Green, colour.Blue);

    private static SKFont FontOf(SKTypeface typeface, float size) => new(typeface, size) { Subpixel = true, Edging = SKFontEdging.Antialias };

    private static void DrawText(SKCanvas canvas, string text, float y, SKFont font, Rgb colour, float x = PictureStyle.Edge)
    {
        using var paint = new SKPaint { Color = ToSkia(colour), IsAntialias = true };
        canvas.DrawText(text, x, y, font, paint);
    }

    /// <summary>Cuts a text that is too long, and shows that it was cut.</summary>
    private static string Fit(string text, SKFont font, float width)
    {
        if (font.MeasureText(text) <= width)
        {
            return text;
        }

        int length = text.Length;
        while (length > 1 && font.MeasureText(text[..length] + "…") > width)
        {
            length--;
        }

        return text[..length] + "…";
    }

    /// <summary>One row at the right, on the line of the subtitle.</summary>
    /// <returns>Width that it takes.</returns>
    private static float DrawLegend(SKCanvas canvas, Picture picture)
    {
        using SKFont font = FontOf(PictureFonts.Regular, PictureStyle.TickSize);
        float room = (picture.Width - 2 * PictureStyle.Edge) * PictureStyle.LegendShare;
        (LegendEntry Entry, float Width)[] shown = FitLegend(picture.Legend, font, room);
        float width = shown.Sum(item => item.Width);
        float x = picture.Width - PictureStyle.Edge - width + EntryGap;
        foreach ((LegendEntry entry, float entryWidth) in shown)
        {
            DrawSwatch(canvas, x, entry.Colour);
            DrawText(canvas, entry.Name, SubtitleBase, font, PictureStyle.Text, x + SwatchWidth + SwatchGap);
            x += entryWidth;
        }

        return width;
    }

    /// <summary>Names are shortened together until the row fits.</summary>
    private static (LegendEntry Entry, float Width)[] FitLegend(IReadOnlyList<LegendEntry> entries, SKFont font, float room)
    {
        float frame = SwatchWidth + SwatchGap + EntryGap;
        float widest = entries.Select(entry => font.MeasureText(entry.Name)).DefaultIfEmpty().Max();
        while (true)
        {
            (LegendEntry Entry, float Width)[] row = [.. entries
                .Select(entry => entry with { Name = Fit(entry.Name, font, widest) })
                .Select(entry => (entry, font.MeasureText(entry.Name) + frame))];
            if (row.Sum(item => item.Item2) <= room || widest < PictureStyle.TickSize)
            {
                return row;
            }

            widest -= PictureStyle.TickSize / 2;
        }
    }

    private static void DrawSwatch(SKCanvas canvas, float x, Rgb colour)
    {
        using var paint = new SKPaint { Color = ToSkia(colour), IsAntialias = true, StrokeWidth = PictureStyle.PredictionWeight };
        float y = SubtitleBase - PictureStyle.TickSize / 3;
        canvas.DrawLine(x, y, x + SwatchWidth, y, paint);
    }
}
