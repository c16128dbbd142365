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
            bool isNew = visited.Add(RealPath.Of(next));
            if ((named is not null && !CanGoOn(chain, named, isNew, diagnostics))
                || reader.Read(next, named, diagnostics) is not YamlMap root
                || !DocumentHeader.Is(root, kind, diagnostics))
            {
                return null;
            }

            chain.Add(root);
            if (root[BasedOn] is not YamlNode link)
            {
                return chain;
            }

            if (!IsPath(link, diagnostics))
            {
                return null;
            }

            named = link.File();
            next = named.FullPath;
        }
    }

    private bool CanGoOn(List<YamlMap> chain, FileReference named, bool isNew, DiagnosticBag diagnostics)
    {
        if (!isNew)
        {
            diagnostics.Error(ConfigCodes.BaseCycle, $"`{named.Written}` leads back to a document of the same chain", named.Span,
                "let one document of the chain stand on its own", Chain(chain));
        }
        else if (chain.Count >= options.MaximumBaseDepth)
        {
            diagnostics.Error(ConfigCodes.BaseCycle,
                $"more than {options.MaximumBaseDepth} documents are based on each other", named.Span);
        }

        return isNew && chain.Count < options.MaximumBaseDepth;
    }

    private static bool IsPath(YamlNode link, DiagnosticBag diagnostics)
    {
        bool isPath = link is YamlScalar { IsEmpty: false, IsRemoval: false } scalar
            && !string.IsNullOrWhiteSpace(scalar.Text) && !scalar.Text.Any(char.IsControl);
        if (!isPath)
        {
            diagnostics.Error(ConfigCodes.WrongKind, $"`{BasedOn}` is {link.Describe()}, expected the path of an assembly file", link.Span);
        }

        return isPath;
    }

    private static string Chain(List<YamlMap> chain) => $"chain: {string.Join(" → ", chain.Select(map => map.Source.DisplayPath))}";
}
