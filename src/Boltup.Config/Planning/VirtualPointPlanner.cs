using Boltup.Config.Binding;
using Boltup.Config.Documents;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Geometry;
using Boltup.Engine.Parts;
using Boltup.Engine.Spectra;
using Boltup.Engine.VirtualPoints;

namespace Boltup.Config.Planning;

/// <summary>Gives a measured part its virtual points.</summary>
internal sealed class VirtualPointPlanner(
    IReadOnlyList<VirtualPointDocument> documents, IReadOnlyList<PointDocument> points, DiagnosticBag diagnostics)
{
    /// <summary>The part with its virtual points, or null after an error.</summary>
    public IPartModel? Plan(IPartModel? data) =>
        data is null || documents.Count == 0 ? data
        : PointsOf(data) is { } planned ? new VirtualPointPart(data, planned)
        : null;

    /// <summary>The virtual points with their channels, or null after an error.</summary>
    public IReadOnlyList<VirtualPoint>? PointsOf(IPartModel data)
    {
        if (!documents.Aggregate(true, (complete, document) => HasData(document, data) && complete))
        {
            return null;
        }

        VirtualPoint[] planned = [.. documents.Select(document => new VirtualPoint(
            document.Name.Value,
            document.At.Value,
            document.Axes?.Value ?? Rotation.None,
            ChannelsOf(document, document.Sensors, data.Responses),
            ChannelsOf(document, document.Impacts, data.Excitations)))];
        bool fine = planned.Zip(documents).All(pair => VirtualPointCheck.SeesAllMotions(pair.First, pair.Second.Name.Span, diagnostics));
        return fine ? planned : null;
    }

    private bool HasData(VirtualPointDocument document, IPartModel data) =>
        HasData(document, document.Sensors, data.Responses, "sensor", "moves at") & HasData(document, document.Impacts, data.Excitations, "impact", "is excited at");

    /// <summary>A channel that the document counts on and the data lack would leave a point that is judged, and moves, by fewer.</summary>
    private bool HasData(
        VirtualPointDocument document, IReadOnlyList<Marked<string>> names, IReadOnlyCollection<Dof> known, string kind, string verb)
    {
        Marked<string>[] missing = [.. names.Where(name => !known.Any(dof => dof.Point == name.Value && dof.IsTranslation))];
        foreach (Marked<string> name in missing)
        {
            diagnostics.Error(
                PlanCodes.ChannelWithoutData,
                $"virtual point `{document.Name}`: no FRF {verb} its {kind} `{name}`",
                name.Span,
                "name the point as the data do, give it its `node`, or leave it out of the virtual point");
        }

        return missing.Length == 0;
    }

    private MeasuredChannel[] ChannelsOf(VirtualPointDocument document, IReadOnlyList<Marked<string>> names, IReadOnlyCollection<Dof> known) =>
    [
        .. names.SelectMany(name => known.Where(dof => dof.Point == name.Value && dof.IsTranslation).Order()
            .Select(dof => ChannelOf(document, points.First(point => point.Name.Value == name.Value), dof))),
    ];

    private static MeasuredChannel ChannelOf(VirtualPointDocument document, PointDocument point, Dof dof)
    {
        Rotation axes = point.Axes?.Value ?? Rotation.None;
        Vector3d along = dof.Direction switch { Direction.X => axes.X, Direction.Y => axes.Y, _ => axes.Z };
        double weight = document.Weights.Where(each => each.Point.Value == point.Name.Value).Select(each => each.Weight).DefaultIfEmpty(1).First();
        return new MeasuredChannel(dof, point.At!.Value, along, weight);
    }
}
