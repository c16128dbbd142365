namespace Boltup.Reports.Pictures;

/// <summary>What a line colour means.</summary>
public readonly record struct LegendEntry(string Name, Rgb Colour);
