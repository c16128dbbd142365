namespace Boltup.Reports.Pictures;

/// <summary>Rows of values over the abscissa of a panel, shown as colours. The rows share the height of the panel evenly, the first at the top.</summary>
/// <param name="X">Abscissa of each value, rising, in the unit of the axis.</param>
/// <param name="Rows">For each row one value per abscissa; NaN is shown as the lowest.</param>
/// <param name="From">Value of the lightest colour, which lower ones share.</param>
/// <param name="To">Value of the darkest colour, which higher ones share.</param>
public sealed record ColourMap(IReadOnlyList<double> X, IReadOnlyList<IReadOnlyList<double>> Rows, double From, double To)
{
    /// <summary>The colour of a value.</summary>
    public Rgb ColourOf(double value) => PictureStyle.ShadeAt(double.IsNaN(value) ? 0 : (value - From) / (To - From));

    /// <summary>
    /// The value of a row between two places of the abscissa: the largest one there, so that no narrow peak is lost, or else the nearest.
    /// </summary>
    public double Between(int row, double from, double to)
    {
        int first = IndexFrom(from);
        double largest = double.NaN;
        for (int i = first; i < X.Count && X[i] < to; i++)
        {
            largest = double.IsNaN(largest) || Rows[row][i] > largest ? Rows[row][i] : largest;
        }

        return double.IsNaN(largest) ? Rows[row][Nearest(first, (from + to) / 2)] : largest;
    }

    /// <summary>The first place at or above an abscissa.</summary>
    private int IndexFrom(double x)
    {
        (int low, int high) = (0, X.Count);
        while (low < high)
        {
            int middle = (low + high) / 2;
            (low, high) = X[middle] < x ? (middle + 1, high) : (low, middle);
        }

        return low;
    }

    private int Nearest(int first, double x)
    {
        int above = Math.Min(first, X.Count - 1);
        int below = Math.Max(above - 1, 0);
        return x - X[below] < X[above] - x ? below : above;
    }
}
