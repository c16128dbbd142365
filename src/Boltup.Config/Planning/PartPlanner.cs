using Boltup.Config.Binding;
using Boltup.Config.Documents;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Geometry;
using Boltup.Engine.Parts;
using Boltup.Engine.Spectra;

namespace Boltup.Config.Planning;

/// <summary>Turns the parts of an assembly into engine parts.</summary>
internal sealed class PartPlanner(DataLibrary library, DiagnosticBag diagnostics)
{
    /// <summary>The part at its place, or null after an error.</summary>
    public PlacedPart? Plan(PlacedPartDocument placed)
    {
        PartDocument document = placed.Document!;
        IPartModel? model = document.Model switch
        {
            LumpedModelDocument lumped => PlanLumped(placed.Name.Value, lumped),
            FrfModelDocument frf => new VirtualPointPlanner(document.VirtualPoints, document.Points, diagnostics)
                .Plan(new FrfPlanner(library, diagnostics).Plan(placed.Name.Value, document, frf)),
            _ => throw new InvalidOperationException($"no planner for {document.Model.GetType().Name}"),
        };
        return model is null
            ? null
            : new PlacedPart(
                placed.Name.Value,
                model,
                [.. document.AllPoints.Select(PlanPoint)],
                placed.Turned is { } turn ? Rotation.About(turn.About.Value, turn.AngleRad.Value) : Rotation.None,
                placed.Moved?.Value ?? Vector3d.Zero,
                placed.Name.Span);
    }

    private static PartPoint PlanPoint(PointDocument point) =>
        new(point.Name.Value, point.At?.Value, point.Axes?.Value ?? Rotation.None);

    private static LumpedPart PlanLumped(string name, LumpedModelDocument lumped)
    {
        string[] masses = [.. lumped.Masses.Select(mass => mass.Point.Value)];
        LumpedLink Link(LumpedLinkDocument link)
        {
            // The engine's link begins at a mass: a link from the ground is the same link seen from its other end.
            string first = link.First.Value ?? link.Second.Value!;
            string? second = link.First.Value is null ? null : link.Second.Value;
            return new LumpedLink(
                Array.IndexOf(masses, first),
                second is null ? null : Array.IndexOf(masses, second),
                link.StiffnessNPerM,
                link.LossFactor,
                link.DampingNsPerM);
        }

        return new LumpedPart(
            name,
            lumped.Direction.Value,
            [.. lumped.Masses.Select(mass => (mass.Point.Value, mass.MassKg.Value))],
            [.. lumped.Links.Select(Link)]);
    }
}
