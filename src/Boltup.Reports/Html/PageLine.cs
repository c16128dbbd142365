namespace Boltup.Reports.Html;

/// <summary>One line of a chart.</summary>
/// <param name="Axis">Place of the operation, whose frequencies the line has.</param>
/// <param name="Decibels">Level per frequency line, NaN where there is none.</param>
public sealed record PageLine(string Operation, int Axis, IReadOnlyList<float> Decibels);
