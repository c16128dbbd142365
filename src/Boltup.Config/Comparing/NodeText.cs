using Boltup.Config.Yaml;

namespace Boltup.Config.Comparing;

/// <summary>Nodes on one line, as a difference shows them.</summary>
internal static class NodeText
{
    private const int Longest = 100;

    public static string Of(YamlNode node)
    {
        string text = Whole(node);
        return text.Length <= Longest ? text : text[..(Longest - 1)] + "…";
    }

    private static string Whole(YamlNode node) => node switch
    {
        YamlMap map => map.Entries.Count == 0 ? "{}" : $"{{ {string.Join(", ", map.Entries.Select(entry => $"{entry.Key}: {Whole(entry.Value)}"))} }}",
        YamlList list => $"[{string.Join(", ", list.Items.Select(Whole))}]",
        _ => ((YamlScalar)node).Text,
    };
}
