using SkiaSharp;

namespace Boltup.Reports.Pictures;

/// <summary>Paints a colour map, pixel by pixel, into the frame of its panel.</summary>
internal static class MapDrawer
{
    /// <param name="frame">Area between the axes, in pixels.</param>
    public static void Draw(SKBitmap bitmap, SKRectI frame, PictureAxis x, ColourMap map)
    {
        for (int row = 0; row < map.Rows.Count; row++)
        {
            int top = frame.Top + row * frame.Height / map.Rows.Count;
            int bottom = frame.Top + (row + 1) * frame.Height / map.Rows.Count;
            for (int column = 0; column < frame.Width; column++)
            {
                double value = map.Between(row, At(x, (double)column / frame.Width), At(x, (double)(column + 1) / frame.Width));
                SKColor colour = PictureWords.ToSkia(map.ColourOf(value));
                for (int line = top; line < bottom; line++)
                {
                    bitmap.SetPixel(frame.Left + column, line, colour);
                }
            }
        }
    }

    /// <summary>The abscissa at a share of the width.</summary>
    private static double At(PictureAxis axis, double share) => axis.IsLogarithmic
        ? axis.From * Math.Pow(axis.To / axis.From, share)
        : axis.From + share * (axis.To - axis.From);
}
