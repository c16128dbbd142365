using Boltup.Config.Binding;
using Boltup.Config.Units;
using Boltup.Config.Yaml;
using Boltup.Engine.Diagnostics;

namespace Boltup.Config.Documents;

/// <summary>Turns the validated nodes of a part file into a document.</summary>
internal sealed class PartBinder(DiagnosticBag diagnostics)
{
    public PartDocument Bind(YamlMap root) => new(
        root.Source,
        root["title"]?.MarkedText(),
        [.. root["points"].Entries().Select(point => PointBinder.Bind(point, diagnostics))],
        root["lumped"] is YamlMap lumped ? BindLumped(lumped) : BindFrf(root["frf"]!),
        root["reciprocity"] is YamlNode fill ? new(true, fill.Span) : null,
        VirtualPointBinder.Bind(root["virtual_points"], diagnostics))
    {
        Root = root,
    };

    private static FrfModelDocument BindFrf(YamlNode files) => new([.. files.Items().Cast<YamlMap>().Select(FrfFileBinder.Bind)]);

    private static LumpedModelDocument BindLumped(YamlMap map) => new(
        map["direction"]!.Direction(),
        [.. map["masses"].Entries().Select(mass => new LumpedMassDocument(mass.MarkedKey(), mass.Value.MarkedSi(Dimension.Mass)))],
        [.. map["links"].Items().Cast<YamlMap>().Select(BindLink)]);

    private static LumpedLinkDocument BindLink(YamlMap map)
    {
        IReadOnlyList<YamlNode> ends = map["between"].Items();
        return new LumpedLinkDocument(
            BindEnd(ends[0]),
            BindEnd(ends[1]),
            map["stiffness"]?.Si(Dimension.Stiffness) ?? 0,
            map["loss_factor"]?.Number() ?? 0,
            map["damping"]?.Si(Dimension.Damping) ?? 0);
    }

    private static Marked<string?> BindEnd(YamlNode node) => new(node.Text() == GroundPoint.Name ? null : node.Text(), node.Span);
}
