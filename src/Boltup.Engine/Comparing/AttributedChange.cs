namespace Boltup.Engine.Comparing;

/// <summary>What one edit does to the overall level of a response by itself, to first order.</summary>
/// <param name="Cause">What was edited, such as <c>mount rear</c>, <c>part body</c>.</param>
public sealed record AttributedChange(string Cause, double Decibels);
