namespace Boltup.Reports.Pictures;

/// <summary>A line of a picture. NaN leaves a gap.</summary>
/// <param name="Name">As the legend names it; empty for a line that needs no name.</param>
/// <param name="X">Abscissa in the unit of the axis, not its logarithm.</param>
/// <param name="Thin">Whether it stands for comparison rather than for the prediction.</param>
public sealed record Series(string Name, IReadOnlyList<double> X, IReadOnlyList<double> Y, Rgb Colour, bool Thin = false);
