using Boltup.Config.Binding;
using Boltup.Config.Yaml;
using Boltup.Engine.Diagnostics;

namespace Boltup.Config.Overlays;

/// <summary>
/// Lays one map over another: maps merge key by key, anything else replaces what the base has, <c>~</c> removes a key.
/// Keys keep the order of the base, new ones follow. Every node keeps the file and place it was written in.
/// </summary>
internal static class OverlayMerge
{
    public static YamlMap Merge(YamlMap below, YamlMap above, DiagnosticBag diagnostics)
    {
        var entries = new List<YamlEntry>(below.Entries.Count + above.Entries.Count);
        foreach (YamlEntry entry in below.Entries)
        {
            if (Resolve(entry, above.Find(entry.Key), diagnostics) is YamlEntry resolved)
            {
                entries.Add(resolved);
            }
        }

        foreach (YamlEntry entry in above.Entries.Where(entry => below.Find(entry.Key) is null))
        {
            if (IsRemoval(entry))
            {
                NothingToRemove(entry, below, diagnostics);
            }
            else
            {
                entries.Add(entry);
            }
        }

        return new YamlMap(above.Source, above.Span, entries);
    }

    private static YamlEntry? Resolve(YamlEntry below, YamlEntry? above, DiagnosticBag diagnostics)
    {
        if (above is null)
        {
            return below;
        }

        if (IsRemoval(above))
        {
            return null;
        }

        return below.Value is YamlMap lower && above.Value is YamlMap upper
            ? above with { Value = Merge(lower, upper, diagnostics) }
            : above;
    }

    private static bool IsRemoval(YamlEntry entry) => entry.Value is YamlScalar { IsRemoval: true };

    private static void NothingToRemove(YamlEntry entry, YamlMap below, DiagnosticBag diagnostics)
    {
        string[] known = [.. below.Entries.Select(lower => lower.Key)];
        diagnostics.Error(ConfigCodes.NothingToRemove, $"the base has no `{Excerpt.Of(entry.Key)}` to remove", entry.KeySpan,
            NearestName.Suggest(entry.Key, known), Words.Known("keys there", known));
    }
}
