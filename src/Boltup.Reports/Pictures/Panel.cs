namespace Boltup.Reports.Pictures;

/// <summary>One diagram of a picture.</summary>
/// <param name="Place">Left, top, width and height as shares of the area below the title.</param>
public sealed record Panel(
    string Title, PictureAxis X, PictureAxis Y, IReadOnlyList<Series> Series, (double Left, double Top, double Width, double Height) Place)
{
    public Marker? Marker { get; init; }

    /// <summary>Filled rectangles, under the lines.</summary>
    public IReadOnlyList<Bar> Bars { get; init; } = [];

    /// <summary>Fills the frame with colours; there are no lines then.</summary>
    public ColourMap? Map { get; init; }

    /// <summary>Pixels left of the frame, for the labels of the ordinate.</summary>
    public float LeftRoom { get; init; } = PictureStyle.LabelRoom;
}
