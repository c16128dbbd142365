using Boltup.Config.Binding;
using Boltup.Config.Yaml;

namespace Boltup.Config.Documents;

/// <summary>An assembly file with its bases merged in and its parts loaded.</summary>
/// <param name="Source">The top file.</param>
/// <param name="Bases">The files it is based on, nearest first.</param>
/// <param name="JointGapM">Distance in metres up to which joined points count as coinciding.</param>
public sealed record AssemblyDocument(
    SourceFile Source,
    IReadOnlyList<SourceFile> Bases,
    Marked<string>? Title,
    FrequencyDocument? Frequencies,
    IReadOnlyList<PlacedPartDocument> Parts,
    IReadOnlyList<MountDocument> Mounts,
    IReadOnlyList<JointDocument> Joints,
    IReadOnlyList<OperationDocument> Operations,
    IReadOnlyList<ResponseDocument> Responses,
    double JointGapM)
{
    /// <summary>Limits on responses.</summary>
    public IReadOnlyList<TargetDocument> Targets { get; init; } = [];

    /// <summary>The nodes that it was bound from, with the bases merged in.</summary>
    public required YamlMap Root { get; init; }

    public PlacedPartDocument? FindPart(string name) => Parts.FirstOrDefault(part => part.Name.Value == name);

    public MountDocument? FindMount(string name) => Mounts.FirstOrDefault(mount => mount.Name.Value == name);

    /// <summary>The law that a mount has after following its <c>like</c> keys, and the product of the scales on the way.</summary>
    /// <exception cref="InvalidOperationException">There is no such mount, or the keys lead in a circle; never after loading.</exception>
    public ScaledLaw LawOf(string mount)
    {
        double scale = 1;
        string name = mount;
        for (int i = 0; i <= Mounts.Count; i++)
        {
            MountLawDocument law = FindMount(name)?.Law ?? throw new InvalidOperationException($"no mount `{name}`");
            if (law is not LikeLawDocument like)
            {
                return new ScaledLaw(law, scale);
            }

            scale *= like.Scale;
            name = like.Mount.Value;
        }

        throw new InvalidOperationException($"mount `{mount}` is like itself");
    }
}
