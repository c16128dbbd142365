using Boltup.Engine.Acoustics;
using Boltup.Engine.Diagnostics;

namespace Boltup.Engine.Targets;

/// <summary>A limit on a response.</summary>
/// <param name="Operations">Operations that it holds for; all when empty.</param>
/// <param name="FromHz">First frequency that counts; null from the first line.</param>
/// <param name="ToHz">Last frequency that counts; null to the last line.</param>
/// <param name="Limits">
/// In dB re the reference of the response's quantity: one entry without a band for an overall limit, or one for each third octave.
/// </param>
public sealed record Target(
    string Name,
    string Response,
    IReadOnlyList<string> Operations,
    FrequencyWeighting Weighting,
    double? FromHz,
    double? ToHz,
    IReadOnlyList<TargetLimit> Limits)
{
    public SourceSpan? Origin { get; init; }
}
