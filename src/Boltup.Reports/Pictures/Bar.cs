namespace Boltup.Reports.Pictures;

/// <summary>A filled rectangle of a panel, in the units of its axes.</summary>
/// <param name="Text">Written beside its right end; empty for none.</param>
public sealed record Bar(double Left, double Right, double Bottom, double Top, Rgb Colour, string Text = "");
