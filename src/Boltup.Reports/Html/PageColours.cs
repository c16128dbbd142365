using System.Globalization;
using Boltup.Reports.Pictures;

namespace Boltup.Reports.Html;

/// <summary>The colours of pictures as variables of the page's style, for light and dark.</summary>
internal static class PageColours
{
    public static readonly Rgb DarkPaper = new(0x15, 0x1B, 0x20);

    private static readonly Rgb DarkText = new(0xE6, 0xEA, 0xED);
    private static readonly Rgb DarkQuiet = new(0xA5, 0xB0, 0xB9);
    private static readonly Rgb DarkGrid = new(0x33, 0x3D, 0x45);

    /// <summary>Line colours on dark paper: as on light paper, with white mixed in until they stand out.</summary>
    public static IReadOnlyList<Rgb> DarkLines { get; } = [.. PictureStyle.Lines.Select(Lighten)];

    public static string Style() =>
        $":root{{{Light()}}}@media screen and (prefers-color-scheme:dark){{:root{{{Dark()}}}}}";

    private static string Light() => Variables(PictureStyle.Paper, PictureStyle.Text, PictureStyle.Quiet, PictureStyle.Grid, PictureStyle.Lines);

    private static string Dark() => Variables(DarkPaper, DarkText, DarkQuiet, DarkGrid, DarkLines);

    private static string Variables(Rgb paper, Rgb text, Rgb quiet, Rgb grid, IReadOnlyList<Rgb> lines) =>
        $"--paper:{Hex(paper)};--text:{Hex(text)};--quiet:{Hex(quiet)};--grid:{Hex(grid)};"
        + string.Concat(lines.Select((line, i) => string.Create(CultureInfo.InvariantCulture, $"--line{i}:{Hex(line)};")));

    private static string Hex(Rgb colour) => $"#{colour.Red:x2}{colour.Green:x2}{colour.Blue:x2}";

    private static Rgb Lighten(Rgb colour)
    {
        Rgb lighter = colour;
        for (int step = 1; lighter.ContrastWith(DarkPaper) < 4.5; step++)
        {
            lighter = new Rgb(Mix(colour.Red, step), Mix(colour.Green, step), Mix(colour.Blue, step));
        }

        return lighter;
    }

    private static byte Mix(byte channel, int step) => (byte)Math.Min(255, channel + (255 - channel) * step / 32);
}
