using Boltup.Config.Binding;
using Boltup.Engine.Acoustics;
using Boltup.Engine.Targets;

namespace Boltup.Config.Documents;

/// <summary>A limit on a response.</summary>
/// <param name="Operations">Operations that it holds for; all when empty.</param>
/// <param name="Limits">One without a band, or one for each third octave.</param>
public sealed record TargetDocument(
    Marked<string> Name,
    Marked<string> Response,
    IReadOnlyList<Marked<string>> Operations,
    Marked<FrequencyWeighting>? Weighting,
    double? FromHz,
    double? ToHz,
    IReadOnlyList<TargetLimit> Limits)
{
    public Target ToTarget() => new(
        Name.Value, Response.Value, [.. Operations.Select(operation => operation.Value)], Weighting?.Value ?? FrequencyWeighting.Z, FromHz, ToHz, Limits)
    { Origin = Name.Span };
}
