using Boltup.Engine.Diagnostics;

namespace Boltup.Engine.Comparing;

/// <summary>One thing in which the inputs of two assemblies differ.</summary>
/// <param name="Path">Where it is, as in <c>mounts.rear.stiffness.z</c>.</param>
/// <param name="Before">As the base writes it; null for what was added.</param>
/// <param name="After">As the changed assembly writes it; null for what was removed.</param>
public sealed record InputDifference(string Path, InputDifferenceKind Kind, string? Before, string? After)
{
    /// <summary>Change of a number, relative to what it was; null where that means nothing.</summary>
    public double? Relative { get; init; }

    /// <summary>Whether no result depends on it, as on a title.</summary>
    public bool IsRemark { get; init; }

    /// <summary>Where the changed assembly writes it, or the base what was removed.</summary>
    public SourceSpan? Span { get; init; }
}
