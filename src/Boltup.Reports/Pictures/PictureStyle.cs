namespace Boltup.Reports.Pictures;

/// <summary>The one place that decides how pictures look: sizes in pixels, type, weights and colours.</summary>
public static class PictureStyle
{
    public const int PageWidth = 1200;
    public const int PageHeight = 700;
    public const int SheetWidth = 1600;
    public const int SheetHeight = 900;

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
    /// Line colours in the order of use. Any two stay apart for readers who lack red or green cones, neighbours differ in lightness
    /// for grey print, and each has a contrast of at least 3:1 with paper.
    /// </summary>
    public static IReadOnlyList<Rgb> Lines { get; } =
    [
        new(0x12, 0x3F, 0x8C),
        new(0xD9, 0x5F, 0x0E),
        new(0x00, 0x6D, 0x55),
        new(0xB8, 0x45, 0x8F),
        new(0x1E, 0x8F, 0xC4),
        new(0x6E, 0x14, 0x00),
        new(0x82, 0x73, 0xF5),
        new(0x14, 0x32, 0x4F),
    ];

    /// <summary>The colour of the series at a place; more series than colours begin again.</summary>
    public static Rgb LineAt(int index) => Lines[index % Lines.Count];
}
