using Boltup.Config.Binding;

namespace Boltup.Config.Documents;

/// <summary>The keys of virtual points, which parts and benches have alike.</summary>
internal static class VirtualPointShape
{
    private static readonly ListKind Points = new(new TextKind("the name of a point"), Minimum: 1, IsSet: true);

    private static readonly Shape Point = new("a virtual point",
    [
        new("at", SharedKinds.Position, "its position in the axes of the part", IsRequired: true),
        new("axes", new ShapeKind(SharedKinds.Axes), "axes of its six dofs; those of the part by default"),
        new("sensors", Points, "points with sensors around it; every direction found in the data counts"),
        new("impacts", Points, "points that were hit around it; every direction found in the data counts"),
        new("weights", new NamedKind("point", new NumberKind("0.5", Sign.Positive)), "how much a point counts in the fit; 1 by default"),
    ],
    KeyRule.AtLeastOne("sensors", "impacts"));

    public static readonly NamedKind Named = new("virtual point", new ShapeKind(Point), IsDotted: true);
}
