using Boltup.Engine.Diagnostics;

namespace Boltup.Engine.Prediction;

/// <summary>One running condition: its forces and how they add.</summary>
public sealed record Operation(string Name, ForceSum Sum, Amplitude Amplitude, IReadOnlyList<ForceSet> Forces)
{
    public SourceSpan? Origin { get; init; }
}
