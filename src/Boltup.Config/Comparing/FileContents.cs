using Boltup.Config.Binding;
using Boltup.Config.Documents;
using Boltup.Config.Pinning;
using Boltup.Config.Yaml;

namespace Boltup.Config.Comparing;

/// <summary>What stands behind the paths of two assemblies: documents that were loaded, and data files by their content.</summary>
internal sealed class FileContents
{
    private readonly Dictionary<string, (Shape Shape, YamlMap Root)> _documents = new(StringComparer.Ordinal);
    private readonly Dictionary<string, string> _digests = new(StringComparer.Ordinal);

    public FileContents(params IEnumerable<AssemblyDocument> assemblies)
    {
        foreach (AssemblyDocument assembly in assemblies)
        {
            foreach (PlacedPartDocument part in assembly.Parts)
            {
                _documents[part.File.FullPath] = (PartShape.Root, part.Document!.Root);
            }

            foreach (ForceDocument forces in assembly.Operations.SelectMany(operation => operation.Forces).Where(forces => forces.Handover is not null))
            {
                _documents[forces.File.FullPath] = (ForcesShape.Root, forces.Handover!.Root);
            }
        }
    }

    /// <summary>The document behind a path, or null for a data file.</summary>
    public (Shape Shape, YamlMap Root)? DocumentAt(YamlNode path) => _documents.TryGetValue(path.File().FullPath, out var found) ? found : null;

    /// <summary>Whether two paths lead to the same bytes.</summary>
    public bool AreSame(YamlNode before, YamlNode after)
    {
        string one = before.File().FullPath, other = after.File().FullPath;
        return one == other || (new FileInfo(one).Length == new FileInfo(other).Length && DigestOf(one) == DigestOf(other));
    }

    /// <summary>The path as written, with the first digits of its SHA-256.</summary>
    public string Describe(YamlNode path) => $"{path.Text()} ({DigestOf(path.File().FullPath)[..8]})";

    private string DigestOf(string fullPath)
    {
        if (!_digests.TryGetValue(fullPath, out string? digest))
        {
            digest = FileDigest.Of(fullPath);
            _digests.Add(fullPath, digest);
        }

        return digest;
    }
}
