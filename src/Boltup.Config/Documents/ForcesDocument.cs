using Boltup.Config.Binding;
using Boltup.Config.Yaml;

namespace Boltup.Config.Documents;

/// <summary>A handover of blocked forces.</summary>
/// <param name="MountsBelongToSource">Whether the forces act below the mounts; null when the file does not say.</param>
/// <param name="FromHz">First frequency at which the forces hold.</param>
/// <param name="ToHz">Last frequency at which they hold.</param>
/// <param name="Because">Why the band ends there.</param>
public sealed record ForcesDocument(
    SourceFile Source,
    bool? MountsBelongToSource,
    IReadOnlyList<PointDocument> Points,
    double FromHz,
    double ToHz,
    string? Because,
    IReadOnlyList<ForcesOperationDocument> Operations)
{
    /// <summary>The nodes that it was bound from.</summary>
    public required YamlMap Root { get; init; }
}
