using Boltup.Config.Binding;
using Boltup.Config.Units;

namespace Boltup.Config.Documents;

/// <summary>The keys of a part document.</summary>
public static class PartShape
{
    private static readonly Shape FrfFile = new("an FRF file",
    [
        new("file", new PathKind("an FRF file"), "Universal File or FRF CSV", IsRequired: true),
        new("quantity", new ChoiceKind("receptance", "mobility", "accelerance"), "what the motion rows of the file are"),
    ]);

    private static readonly Shape Link = new("a link",
    [
        new("between", new ListKind(new TextKind("the name of a mass or `ground`"), 2, 2),
            "the two masses, or a mass and ground", IsRequired: true),
        new("stiffness", new QuantityKind(Dimension.Stiffness, "120", Sign.NotNegative), "stiffness"),
        new("loss_factor", new NumberKind("0.02", Sign.NotNegative), "loss factor of the stiffness") { Default = "0" },
        new("damping", new QuantityKind(Dimension.Damping, "12", Sign.NotNegative), "viscous damping"),
    ],
    KeyRule.AtLeastOne("stiffness", "damping"), KeyRule.Needs("loss_factor", "stiffness"));

    private static readonly Shape Lumped = new("a lumped model",
    [
        new("direction", new ChoiceKind("x", "y", "z"), "direction in which the masses move", IsRequired: true),
        new("masses", new NamedKind("mass", new QuantityKind(Dimension.Mass, "0.8", Sign.NotNegative), IsDotted: true, Minimum: 1),
            "the masses, each a point with one dof", IsRequired: true),
        new("links", new ListKind(new ShapeKind(Link), Minimum: 0), "springs and dampers"),
    ]);

    public static readonly Shape Root = new("a part",
    [
        new("boltup", new ChoiceKind("part/1"), "kind and version of the document", IsRequired: true),
        new("title", new TextKind("a title"), "what the part is") { IsRemark = true },
        new("points", new NamedKind("point", new ShapeKind(SharedKinds.Point), IsDotted: true), "named places on the part"),
        new("virtual_points", VirtualPointShape.Named, "points of six dofs with sensors and impacts around them"),
        new("frf", new ListKind(new ShapeKind(FrfFile)), "files of measured or computed FRFs"),
        new("lumped", new ShapeKind(Lumped), "masses and links along one direction"),
        new("modal", new ReservedKind(), "natural frequencies, damping ratios and mode shapes"),
        new("matrices", new ReservedKind(), "mass, damping and stiffness matrices"),
        new("rigid_body", new ReservedKind(), "mass, centre and inertia"),
        new("frame", new ReservedKind(), "frame of beams in space"),
        new("reciprocity", new ChoiceKind("fill"), "use a measured Y_ji where Y_ij is missing"),
    ],
    KeyRule.ExactlyOne("frf", "lumped", "modal", "matrices", "rigid_body", "frame"), KeyRule.Needs("virtual_points", "frf"));
}
