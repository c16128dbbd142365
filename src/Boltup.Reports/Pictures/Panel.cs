namespace Boltup.Reports.Pictures;

/// <summary>One diagram of a picture.</summary>
/// <param name="Place">Left, top, width and height as shares of the area below the title.</param>
public sealed record Panel(
    string Title, PictureAxis X, PictureAxis Y, IReadOnlyList<Series> Series, (double Left, double Top, double Width, double Height) Place)
{
    public Marker? Marker { get; init; }
}
