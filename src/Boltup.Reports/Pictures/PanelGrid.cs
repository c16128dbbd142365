namespace Boltup.Reports.Pictures;

/// <summary>Places panels of equal size on a sheet.</summary>
internal static class PanelGrid
{
    /// <summary>As many panels as a sheet holds legibly.</summary>
    public const int Most = 12;

    public static Panel Panel(string title, int index, int count, PictureAxis x, PictureAxis y, IReadOnlyList<Series> series) =>
        new(title, x, y, series, PlaceOf(index, count));

    /// <summary>Left, top, width and height as shares of the sheet.</summary>
    public static (double Left, double Top, double Width, double Height) PlaceOf(int index, int count)
    {
        int columns = count <= 1 ? 1 : count <= 4 ? 2 : count <= 9 ? 3 : 4;
        int rows = (count + columns - 1) / columns;
        return ((double)(index % columns) / columns, (double)(index / columns) / rows, 1.0 / columns, 1.0 / rows);
    }
}
