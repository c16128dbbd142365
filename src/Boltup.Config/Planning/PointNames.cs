using Boltup.Config.Documents;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Spectra;

namespace Boltup.Config.Planning;

/// <summary>Gives the dofs of data files the point names of a part; a part that lists no points keeps the names of the data.</summary>
internal sealed class PointNames
{
    private readonly Dictionary<string, string>? _byNameInData;

    public PointNames(IReadOnlyList<PointDocument> points, DiagnosticBag diagnostics)
    {
        if (points.Count == 0)
        {
            return;
        }

        _byNameInData = [];
        foreach (PointDocument point in points)
        {
            string nameInData = point.Node is { } node ? node.ToString() : point.Name.Value;
            if (!_byNameInData.TryAdd(nameInData, point.Name.Value))
            {
                diagnostics.Error(
                    PlanCodes.NodeTwice,
                    $"points `{_byNameInData[nameInData]}` and `{point.Name}` have the same node {nameInData}",
                    point.Node?.Span ?? point.Name.Span,
                    "correct the node of one of them");
            }
        }
    }

    /// <summary>
    /// The dof under the part's own point name, or null when the part does not list the point. Data name it by its node, or as the part does.
    /// </summary>
    public Dof? Resolve(Dof inData) => _byNameInData is null ? inData
        : _byNameInData.TryGetValue(inData.Point, out string? name) ? inData with { Point = name }
        : _byNameInData.ContainsValue(inData.Point) ? inData
        : null;
}
