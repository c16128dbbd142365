using ScottPlot;
using SkiaSharp;

namespace Boltup.Reports.Pictures;

/// <summary>The fonts that come with the program, so that pictures are the same on every machine, also on one without fonts.</summary>
internal sealed class PictureFonts : IFontResolver
{
    public const string Family = "Inter";

    private static readonly Lazy<PictureFonts> Shared = new(Register);

    private readonly SKTypeface _regular = Load("Inter-Regular.otf");
    private readonly SKTypeface _strong = Load("Inter-SemiBold.otf");

    private PictureFonts()
    {
    }

    public static SKTypeface Regular => Shared.Value._regular;

    public static SKTypeface Strong => Shared.Value._strong;

    /// <summary>Every name gets our font: nothing depends on what the machine has.</summary>
    public SKTypeface CreateTypeface(string fontName, FontWeight weight, FontSlant slant, FontSpacing spacing) =>
        weight > FontWeight.Medium ? _strong : _regular;

    public SKTypeface CreateTypeface(string fontName, bool bold, bool italic) => bold ? _strong : _regular;

    private static PictureFonts Register()
    {
        var fonts = new PictureFonts();
        Fonts.FontResolvers.Insert(0, fonts);
        Fonts.Default = Family;
        Fonts.Sans = Family;
        return fonts;
    }

    private static SKTypeface Load(string name)
    {
        using Stream stream = typeof(PictureFonts).Assembly.GetManifestResourceStream(name)!;
        return SKTypeface.FromStream(stream);
    }
}
