namespace Boltup.Reports.Pictures;

/// <summary>An axis of a panel.</summary>
/// <param name="Label">With its unit, and the reference of a level.</param>
public sealed record PictureAxis(string Label, double From, double To, bool IsLogarithmic, IReadOnlyList<AxisTick> Ticks);
