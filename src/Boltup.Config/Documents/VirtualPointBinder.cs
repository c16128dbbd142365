using Boltup.Config.Binding;
using Boltup.Config.Yaml;
using Boltup.Engine.Diagnostics;

namespace Boltup.Config.Documents;

/// <summary>Binds virtual points and checks the names that they use.</summary>
internal static class VirtualPointBinder
{
    public static IReadOnlyList<VirtualPointDocument> Bind(YamlNode? node, DiagnosticBag diagnostics) =>
        [.. node.Entries().Select(entry => Bind(entry, diagnostics))];

    /// <summary>Channels must be listed points with a position; a virtual point must have a name of its own.</summary>
    public static void Check(IReadOnlyList<VirtualPointDocument> virtualPoints, IReadOnlyList<PointDocument> points, DiagnosticBag diagnostics)
    {
        var names = new KnownNames("point", points.Select(point => point.Name.Value));
        foreach (VirtualPointDocument virtualPoint in virtualPoints)
        {
            if (points.FirstOrDefault(point => point.Name.Value == virtualPoint.Name.Value) is { } same)
            {
                diagnostics.Error(ConfigCodes.VirtualPointTwice, $"`{virtualPoint.Name}` is a point and a virtual point", virtualPoint.Name.Span,
                    "give the virtual point a name of its own", $"the point is at {same.Name.Span}");
            }

            foreach (Marked<string> channel in virtualPoint.Sensors.Concat(virtualPoint.Impacts).Concat(virtualPoint.Weights.Select(weight => weight.Point)))
            {
                if (names.Check(channel.Value, channel.Span, diagnostics) && points.First(point => point.Name.Value == channel.Value).At is null)
                {
                    diagnostics.Error(ConfigCodes.ChannelWithoutPlace, $"`{channel}` has no position", channel.Span,
                        $"write `{channel}: {{ at: [10 mm, 0 mm, 5 mm] }}` among the points");
                }
            }
        }
    }

    private static VirtualPointDocument Bind(YamlEntry entry, DiagnosticBag diagnostics)
    {
        var map = (YamlMap)entry.Value;
        return new VirtualPointDocument(
            entry.MarkedKey(),
            map["at"]!.Position(),
            map["axes"] is YamlMap axes ? AxesBinder.Bind(axes, diagnostics) : null,
            [.. map["sensors"].Items().Select(item => item.MarkedText())],
            [.. map["impacts"].Items().Select(item => item.MarkedText())],
            [.. map["weights"].Entries().Select(weight => (weight.MarkedKey(), weight.Value.Number()))]);
    }
}
