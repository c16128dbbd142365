using System.Globalization;
using Boltup.Config.Documents;
using Boltup.Config.Units;
using Boltup.Config.Yaml;
using Boltup.Engine.Geometry;
using Boltup.Engine.Spectra;

namespace Boltup.Config.Binding;

/// <summary>Reads values from nodes that the validator has passed; anything unexpected here is a bug.</summary>
internal static class NodeValues
{
    public static string Text(this YamlNode node) => ((YamlScalar)node).Text;

    public static Marked<string> MarkedText(this YamlNode node) => new(node.Text(), node.Span);

    public static Marked<string> MarkedKey(this YamlEntry entry) => new(entry.Key, entry.KeySpan);

    public static double Number(this YamlNode node) => QuantityParser.TryParseNumber(node.Text(), out double value)
        ? value
        : throw new InvalidOperationException($"{node.Span}: no number");

    public static int Integer(this YamlNode node) => int.Parse(node.Text(), NumberStyles.None, CultureInfo.InvariantCulture);

    /// <summary>The value of a quantity in SI units.</summary>
    public static double Si(this YamlNode node, Dimension dimension)
    {
        ParsedQuantity parsed = QuantityParser.Parse(node.Text(), dimension);
        return parsed.Fault == QuantityFault.None ? parsed.Si : throw new InvalidOperationException($"{node.Span}: {parsed.Fault}");
    }

    public static Marked<double> MarkedSi(this YamlNode node, Dimension dimension) => new(node.Si(dimension), node.Span);

    public static Marked<Vector3d> Position(this YamlNode node) => Vector(node, item => item.Si(Dimension.Length));

    public static Marked<Vector3d> Vector(this YamlNode node) => Vector(node, Number);

    public static Marked<Direction> Direction(this YamlNode node) => new(DirectionNamed(node.Text()), node.Span);

    public static Direction DirectionNamed(string name) => Dof.TryParseDirection(name, out Direction direction)
        ? direction
        : throw new InvalidOperationException($"`{name}` is no direction");

    public static FileReference File(this YamlNode node)
    {
        string written = node.Text();
        return new FileReference(Path.GetFullPath(written, node.Source.Folder), written, node.Span);
    }

    public static IReadOnlyList<YamlEntry> Entries(this YamlNode? node) => node is null ? [] : ((YamlMap)node).Entries;

    public static IReadOnlyList<YamlNode> Items(this YamlNode? node) => node is null ? [] : ((YamlList)node).Items;

    private static Marked<Vector3d> Vector(YamlNode node, Func<YamlNode, double> component)
    {
        IReadOnlyList<YamlNode> items = node.Items();
        return new(new Vector3d(component(items[0]), component(items[1]), component(items[2])), node.Span);
    }
}
