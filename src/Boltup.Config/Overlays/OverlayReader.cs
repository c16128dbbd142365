using Boltup.Config.Binding;
using Boltup.Config.Documents;
using Boltup.Config.Paths;
using Boltup.Config.Yaml;
using Boltup.Engine.Diagnostics;

namespace Boltup.Config.Overlays;

/// <summary>Reads a document and the chain of documents that it is based on, and merges them.</summary>
internal sealed class OverlayReader(DocumentReader reader, LoadOptions options)
{
    private const string BasedOn = "based_on";

    /// <summary>The merged document, or null with diagnostics.</summary>
    public OverlaidRoot? Read(string path, DocumentKind kind, DiagnosticBag diagnostics)
    {
        List<YamlMap>? chain = ReadChain(path, kind, diagnostics);
        if (chain is null)
        {
            return null;
        }

        YamlMap merged = chain[^1];
        for (int i = chain.Count - 2; i >= 0; i--)
        {
            merged = OverlayMerge.Merge(merged, chain[i], diagnostics);
        }

        return diagnostics.HasErrors ? null : new OverlaidRoot(merged, [.. chain.Skip(1).Select(map => map.Source)]);
    }

    /// <summary>The documents from the top one to the last base.</summary>
    private List<YamlMap>? ReadChain(string path, DocumentKind kind, DiagnosticBag diagnostics)
    {
        var chain = new List<YamlMap>();
        var visited = new HashSet<string>(StringComparer.Ordinal);
        string next = path;
        FileReference? named = null;
        while (true)
        {
            if (!visited.Add(RealPath.Of(next)))
            {
                diagnostics.Error(ConfigCodes.BaseCycle, $"`{named!.Written}` leads back to a document of the same chain", named.Span,
                    "let one document of the chain stand on its own", Chain(chain));
                return null;
            }

            if (chain.Count >= options.MaximumBaseDepth)
            {
                diagnostics.Error(ConfigCodes.BaseCycle, $"more than {options.MaximumBaseDepth} documents are based on each other", named!.Span);
                return null;
            }

            if (reader.Read(next, named, diagnostics) is not YamlMap root || !DocumentHeader.Is(root, kind, diagnostics))
            {
                return null;
            }

            chain.Add(root);
            if (root[BasedOn] is null)
            {
                return chain;
            }

            if (root[BasedOn] is not YamlScalar { IsEmpty: false, IsRemoval: false } link || string.IsNullOrWhiteSpace(link.Text)
                || link.Text.Any(char.IsControl))
            {
                diagnostics.Error(ConfigCodes.WrongKind, $"`{BasedOn}` is {root[BasedOn]!.Describe()}, expected the path of an assembly file",
                    root[BasedOn]!.Span);
                return null;
            }

            named = link.File();
            next = named.FullPath;
        }
    }

    private static string Chain(List<YamlMap> chain) => $"chain: {string.Join(" → ", chain.Select(map => map.Source.DisplayPath))}";
}
