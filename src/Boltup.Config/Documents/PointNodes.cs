using Boltup.Engine.Diagnostics;

namespace Boltup.Config.Documents;

/// <summary>Checks that every node number belongs to one point.</summary>
internal static class PointNodes
{
    public static void Check(IReadOnlyList<PointDocument> points, DiagnosticBag diagnostics)
    {
        var taken = new Dictionary<int, PointDocument>();
        foreach (PointDocument point in points)
        {
            if (point.Node is { } node && !taken.TryAdd(node.Value, point))
            {
                diagnostics.Error(ConfigCodes.SameNode,
                    $"points `{taken[node.Value].Name}` and `{point.Name}` have the same node {node.Value}",
                    node.Span, notes: $"the other is at {taken[node.Value].Node!.Span}");
            }
        }
    }
}
