using Boltup.Config.Binding;
using Boltup.Config.Yaml;
using Boltup.Engine.Diagnostics;

namespace Boltup.Config.Documents;

/// <summary>Binds a named place on a part or a bench.</summary>
internal static class PointBinder
{
    public static PointDocument Bind(YamlEntry entry, DiagnosticBag diagnostics)
    {
        var map = (YamlMap)entry.Value;
        return new PointDocument(
            entry.MarkedKey(),
            map["node"] is YamlNode node ? new(node.Integer(), node.Span) : null,
            map["at"]?.Position(),
            map["axes"] is YamlMap axes ? AxesBinder.Bind(axes, diagnostics) : null);
    }
}
