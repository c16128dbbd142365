namespace Boltup.Reports.Pictures;

/// <summary>The one place that decides how pictures look: sizes in pixels, type, weights and colours.</summary>
public static class PictureStyle
{
    public const int PageWidth = 1200;
    public const int PageHeight = 700;
    public const int SheetWidth = 1600;
    public const int SheetHeight = 900;

    /// <summary>From the rim of the page to its words.</summary>
    public const float Edge = 28;

    /// <summary>Share of the width that the legend may take from the subtitle.</summary>
    public const float LegendShare = 0.65f;

    /// <summary>Left of a frame with numbers, with names, and with nothing.</summary>
    public const float LabelRoom = 76;
    public const float NameRoom = 190;
    public const float NoRoom = 10;

    public const float TitleSize = 24;
    public const float SubtitleSize = 17;
    public const float LabelSize = 16;
    public const float TickSize = 14;
    public const float CaptionSize = 13;

    public const float PredictionWeight = 2.4f;
    public const float ComparisonWeight = 1.1f;

    public static readonly Rgb Paper = new(255, 255, 255);
    public static readonly Rgb Text = new(0x1C, 0x24, 0x2B);
    public static readonly Rgb Quiet = new(0x5B, 0x66, 0x70);
    public static readonly Rgb Grid = new(0xE3, 0xE7, 0xEA);
    public static readonly Rgb FineGrid = new(0xF1, 0xF3, 0xF5);

    /// <summary>
    /// Line colours in the order of use. Any two are at least 20 CIE Lab units apart, for deutan and protan eyes as well; neighbours
    /// differ in lightness, for grey print; each has a contrast of at least 3:1 with paper.
    /// </summary>
    public static IReadOnlyList<Rgb> Lines { get; } =
    [
        new(0x0F, 0x17, 0xA2),
        new(0xCF, 0x7A, 0x06),
        new(0x12, 0x73, 0x4D),
        new(0xD0, 0x71, 0xAB),
        new(0x2E, 0x6D, 0xDD),
        new(0x56, 0x15, 0x06),
        new(0x77, 0x58, 0x04),
        new(0x31, 0x38, 0x3B),
    ];

    /// <summary>
    /// The colours of a map from low to high: lightness falls all the way, so that grey print keeps the order, and hue turns from sand over
    /// rust to plum, for eyes that can use it.
    /// </summary>
    private static readonly (double At, Rgb Colour)[] Shades =
    [
        (0, new(0xF6, 0xF3, 0xEA)),
        (0.24, new(0xEC, 0xB8, 0x5C)),
        (0.52, new(0xC2, 0x5B, 0x33)),
        (0.78, new(0x70, 0x22, 0x4E)),
        (1, new(0x1E, 0x0E, 0x36)),
    ];

    /// <summary>The colour of a map at a share of its range; beyond the ends the colour of the end.</summary>
    public static Rgb ShadeAt(double share)
    {
        double at = Math.Clamp(share, 0, 1);
        int upper = Math.Max(1, Array.FindIndex(Shades, shade => shade.At >= at));
        (double from, Rgb low) = Shades[upper - 1];
        (double to, Rgb high) = Shades[upper];
        double weight = (at - from) / (to - from);
        return new Rgb(Mix(low.Red, high.Red, weight), Mix(low.Green, high.Green, weight), Mix(low.Blue, high.Blue, weight));
    }

    private static byte Mix(byte low, byte high, double weight) => (byte)Math.Round(low + weight * (high - low));

    /// <summary>The colour of the series at a place; more series than colours begin again.</summary>
    public static Rgb LineAt(int index) => Lines[index % Lines.Count];
}
