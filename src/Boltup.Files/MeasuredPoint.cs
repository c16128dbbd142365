namespace Boltup.Files;

/// <summary>A point whose place a data file gives.</summary>
/// <param name="Node">Node number as text.</param>
/// <param name="X">In metres.</param>
/// <param name="Y">In metres.</param>
/// <param name="Z">In metres.</param>
public sealed record MeasuredPoint(string Node, double X, double Y, double Z);
