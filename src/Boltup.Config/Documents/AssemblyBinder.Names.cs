using Boltup.Config.Binding;
using Boltup.Config.Yaml;
using Boltup.Engine.Spectra;

namespace Boltup.Config.Documents;

/// <summary>Dotted names: ends of joints and dofs of responses.</summary>
internal sealed partial class AssemblyBinder
{
    private static readonly string[] ResponseDirections = ["x", "y", "z", "rx", "ry", "rz", "p"];

    private JointDocument? BindJoint(YamlEntry entry)
    {
        var map = (YamlMap)entry.Value;
        IReadOnlyList<YamlNode> between = map["between"].Items();
        JointEndDocument? first = BindEnd(between[0]);
        JointEndDocument? second = BindEnd(between[1]);
        return first is null || second is null
            ? null
            : new JointDocument(entry.MarkedKey(), first, second, [.. map["rigid"].Items().Select(item => item.Direction())],
                map["through"]?.MarkedText());
    }

    private JointEndDocument? BindEnd(YamlNode node)
    {
        string text = node.Text();
        if (text == GroundPoint.Name)
        {
            return new JointEndDocument(null, null, node.Span);
        }

        string[] pieces = text.Split('.');
        if (pieces.Length == 2 && pieces.All(piece => piece.Length > 0))
        {
            return new JointEndDocument(pieces[0], pieces[1], node.Span);
        }

        diagnostics.Error(ConfigCodes.BadDottedName, $"{node.Describe()} is no point of the form `part.point`", node.Span,
            pieces.Length == 1 ? $"write the part before the point, such as `body.{text}`" : "a joint names points without directions");
        return null;
    }

    private ResponseDocument? BindResponse(YamlEntry entry)
    {
        var map = (YamlMap)entry.Value;
        return BindDof(map["at"]!) is Marked<AssemblyDof> at
            ? new ResponseDocument(entry.MarkedKey(), at, BindAs(map["as"], at)) { Weighting = BindWeighting(map["weighting"]) }
            : null;
    }

    private Marked<AssemblyDof>? BindDof(YamlNode node)
    {
        string text = node.Text();
        string[] pieces = text.Split('.');
        if (pieces[0] == GroundPoint.Name)
        {
            diagnostics.Error(ConfigCodes.GroundMisused, "a response on `ground` is always zero", node.Span, "choose a dof of a part");
            return null;
        }

        if (pieces.Length != 3 || pieces.Any(piece => piece.Length == 0))
        {
            diagnostics.Error(ConfigCodes.BadDottedName, $"{node.Describe()} is no dof of the form `part.point.direction`", node.Span,
                pieces.Length == 2 ? $"add the direction, such as `{text}.z`" : null);
            return null;
        }

        if (!ResponseDirections.Contains(pieces[2]))
        {
            string? help = pieces[2] == "q" ? "volume velocity is an excitation; sound pressure is `p`" : null;
            diagnostics.Error(ConfigCodes.BadDottedName, $"`{pieces[2]}` is no direction of a response", node.Span, help,
                $"directions: {Words.List(ResponseDirections)}");
            return null;
        }

        return new(new AssemblyDof(pieces[0], new Dof(pieces[1], NodeValues.DirectionNamed(pieces[2]))), node.Span);
    }

    private Marked<Quantity>? BindAs(YamlNode? node, Marked<AssemblyDof> at)
    {
        if (node is null)
        {
            return null;
        }

        if (at.Value.Dof.Direction == Direction.P)
        {
            diagnostics.Error(ConfigCodes.NeedsOtherKey, "`as` is for motion, and `p` is sound pressure", node.Span, "remove `as`");
        }

        return new(node.Text() switch
        {
            "velocity" => Quantity.Velocity,
            "displacement" => Quantity.Displacement,
            _ => Quantity.Acceleration,
        }, node.Span);
    }
}
