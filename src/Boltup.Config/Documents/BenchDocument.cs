using Boltup.Config.Binding;
using Boltup.Config.Yaml;
using Boltup.Engine.Identification;
using Boltup.Engine.Spectra;

namespace Boltup.Config.Documents;

/// <summary>A bench file: an installed source with sensors, from which blocked forces are identified.</summary>
/// <param name="Interface">Points of the source where forces act.</param>
/// <param name="Directions">Directions of the forces at each of them.</param>
/// <param name="MountsBelongToSource">Whether these points are below the mounts; null when the bench does not say.</param>
public sealed record BenchDocument(
    SourceFile Source,
    Marked<string>? Title,
    FrequencyDocument? Frequencies,
    IReadOnlyList<PointDocument> Points,
    IReadOnlyList<VirtualPointDocument> VirtualPoints,
    IReadOnlyList<Marked<string>> Interface,
    IReadOnlyList<Marked<Direction>> Directions,
    bool? MountsBelongToSource,
    IReadOnlyList<BenchFrfDocument> InstalledFrfs,
    IReadOnlyList<Marked<string>> Indicators,
    IReadOnlyList<Marked<string>> Validation,
    IReadOnlyList<BenchSpectraDocument> Operations,
    Marked<SolveChoice> Solve,
    SecondInstallationDocument? Second,
    BenchModelDocument? Model,
    IReadOnlyList<RouteDocument> Routes)
{
    /// <summary>A point of this name, listed or virtual.</summary>
    public PointDocument? FindPoint(string name) =>
        Points.Concat(VirtualPoints.Select(point => point.AsPoint)).FirstOrDefault(point => point.Name.Value == name);
}
