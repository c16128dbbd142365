namespace Boltup.Reports.Pictures;

/// <summary>A point that a panel points out in words.</summary>
public sealed record Marker(double X, double Y, string Text);
