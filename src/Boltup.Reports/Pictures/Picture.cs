namespace Boltup.Reports.Pictures;

/// <summary>What a picture shows, as data: the drawer turns it into pixels, and a page could turn it into something else.</summary>
/// <param name="Name">File name without ending.</param>
/// <param name="Caption">Where the picture comes from; carries no date, so that equal inputs give equal bytes.</param>
public sealed record Picture(string Name, string Title, string Subtitle, string Caption, int Width, int Height, IReadOnlyList<Panel> Panels)
{
    /// <summary>What the colours mean where lines of several names share panels; drawn beside the subtitle, where it hides no line.</summary>
    public IReadOnlyList<LegendEntry> Legend { get; init; } = [];
}
