using Boltup.Config.Binding;
using Boltup.Config.Units;

namespace Boltup.Config.Documents;

/// <summary>The keys of an assembly document.</summary>
public static class AssemblyShape
{
    private static readonly PathKind PartFile = new("a part file");

    private static readonly Shape Turned = new("a rotation",
    [
        new("about", new EitherKind(new ChoiceKind("x", "y", "z"), new ListKind(new NumberKind("1"), 3, 3)),
            "axis of the assembly, or a vector", IsRequired: true),
        new("by", new QuantityKind(Dimension.Angle, "90"), "angle, right-handed", IsRequired: true),
    ]);

    private static readonly Shape PlacedPart = new("a placed part",
    [
        new("file", PartFile, "the part file", IsRequired: true),
        new("turned", new ShapeKind(Turned), "rotation about the part's origin, before it is moved"),
        new("moved", SharedKinds.Position, "where the part's origin goes"),
    ]);

    private static readonly Shape Relaxation = new("a relaxation",
    [
        new("stiffening", new NumberKind("2.5", Sign.Positive), "stiffness at high over that at low frequency, at least 1", IsRequired: true),
        new("time", new QuantityKind(Dimension.Time, "0.002", Sign.Positive), "relaxation time", IsRequired: true),
        new("order", new NumberKind("0.6", Sign.Positive), "1 for the Zener law, which is the default; less for the fractional Zener law") { Default = "1" },
    ]);

    private static readonly PathKind TableFile = new("a table of dynamic stiffness");

    private static readonly Shape ChosenTable = new("a table of dynamic stiffness",
    [
        new("file", TableFile, "CSV of complex dynamic stiffness over frequency", IsRequired: true),
        new("at", new TextKind("a condition that the table lists, such as `40 degC`"),
            "which table of a file with the column `at`, such as a temperature or preload", IsRequired: true),
    ]);

    private static readonly ListKind MountNames = new(new TextKind("the name of a mount"), Minimum: 2);

    private static readonly Shape Mount = new("a mount",
    [
        new("stiffness", SharedKinds.PerDirection("stiffness", "120", Dimension.Stiffness, Dimension.RotationalStiffness),
            "stiffness per direction; a direction left out is free"),
        new("stiffness_matrix", new StiffnessMatrixKind(), "full symmetric stiffness matrix, rows of x, y, z or x, y, z, rx, ry, rz"),
        new("like", new TextKind("the name of a mount"), "another mount whose law this one has"),
        new("table", new EitherKind(TableFile, new ShapeKind(ChosenTable)), "CSV of complex dynamic stiffness over frequency"),
        new("series", MountNames, "mounts one behind the other, beginning at the first point of the joint"),
        new("parallel", MountNames, "mounts side by side"),
        new("relaxation", new ShapeKind(Relaxation), "how the stiffness rises with frequency from its static value"),
        new("loss_factor", new NumberKind("0.12", Sign.NotNegative), "loss factor of the stiffness") { Default = "0" },
        new("damping", SharedKinds.PerDirection("damping", "12", Dimension.Damping, Dimension.RotationalDamping),
            "viscous damping per direction"),
        new("scale", new NumberKind("0.8", Sign.Positive), "factor on the law of the other mount") { Default = "1" },
    ],
    KeyRule.ExactlyOne("stiffness", "stiffness_matrix", "like", "table", "series", "parallel"),
    KeyRule.Needs("relaxation", "stiffness", "stiffness_matrix"),
    KeyRule.AtMostOne("relaxation", "loss_factor"),
    KeyRule.AtMostOne("relaxation", "damping"),
    KeyRule.Needs("loss_factor", "stiffness", "stiffness_matrix"),
    KeyRule.Needs("damping", "stiffness", "stiffness_matrix"),
    KeyRule.Needs("scale", "like"));

    private static readonly Shape Joint = new("a joint",
    [
        new("between", new ListKind(new TextKind("`part.point` or `ground`"), 2, 2), "the two points that it connects", IsRequired: true),
        new("rigid", new ListKind(SharedKinds.MotionDirection, IsSet: true), "directions that it locks"),
        new("through", new TextKind("the name of a mount"), "the mount that it goes through"),
    ],
    KeyRule.ExactlyOne("rigid", "through"));

    private static readonly Shape Forces = new("a force file",
    [
        new("file", new PathKind("a force file"), "CSV or Universal File of forces, or a handover `*.forces.yaml`", IsRequired: true),
        new("operation", new TextKind("the name of an operation"), "which operation of a handover"),
        new("part", new TextKind("the name of a part"), "the part whose dofs the file names", IsRequired: true),
    ]);

    private static readonly EitherKind ForceList = new(new ShapeKind(Forces), new ListKind(new ShapeKind(Forces)));

    private static readonly Shape Operation = new("an operation",
    [
        new("title", new TextKind("a title"), "what the running condition is") { IsRemark = true },
        new("blocked_forces", ForceList, "blocked forces of sources at their interfaces"),
        new("applied_forces", ForceList, "forces from outside, at any dof"),
        new("sum", new ChoiceKind("phase", "energy"), "how several files add up; in phase by default") { Default = "phase" },
        new("amplitude", new ChoiceKind("rms", "peak"), "what the magnitudes in the files are"),
    ],
    KeyRule.AtLeastOne("blocked_forces", "applied_forces"));

    private static readonly Shape Response = new("a response",
    [
        new("at", new TextKind("`part.point.direction`"), "the dof", IsRequired: true),
        new("as", new ChoiceKind("acceleration", "velocity", "displacement"), "quantity of a motion; acceleration by default") { Default = "acceleration" },
        new("weighting", new ChoiceKind("Wk", "Wd", "Wh"), "how people feel it: body vertical, body horizontal, hand and arm"),
    ]);

    private static readonly QuantityKind Level = new(Dimension.Level, "45");

    private static readonly Shape Target = new("a target",
    [
        new("response", new TextKind("the name of a response"), "the response that it limits", IsRequired: true),
        new("limit", Level, "overall level that must not be exceeded, in dB re the reference of the quantity"),
        new("third_octaves", new NamedKind("band", Level, Minimum: 1), "levels of third octaves, by their nominal centres such as `63 Hz`"),
        new("weighting", new ChoiceKind("A", "C", "Z", "Wk", "Wd", "Wh"), "frequency weighting of sound or of vibration that people feel; none (Z) by default") { Default = "Z" },
        new("from", new QuantityKind(Dimension.Frequency, "20", Sign.NotNegative), "first frequency that counts"),
        new("to", new QuantityKind(Dimension.Frequency, "1000", Sign.Positive), "last frequency that counts"),
        new("operations", new ListKind(new TextKind("the name of an operation"), IsSet: true), "operations that it holds for; all by default"),
    ],
    KeyRule.ExactlyOne("limit", "third_octaves"));

    public static readonly Shape Root = new("an assembly",
    [
        new("boltup", new ChoiceKind("assembly/1"), "kind and version of the document", IsRequired: true),
        new("based_on", new PathKind("an assembly file"), "assembly whose keys this one takes over and changes"),
        new("title", new TextKind("a title"), "what the assembly is") { IsRemark = true },
        new("frequencies", new ShapeKind(SharedKinds.Frequencies), "lines to compute; by default those that the parts share"),
        new("parts", new NamedKind("part", new EitherKind(PartFile, new ShapeKind(PlacedPart)), IsDotted: true, Minimum: 1),
            "the parts and where they are", IsRequired: true),
        new("mounts", new NamedKind("mount", new ShapeKind(Mount)), "resilient elements"),
        new("joints", new NamedKind("joint", new ShapeKind(Joint)), "connections of two points"),
        new("joint_gap", new QuantityKind(Dimension.Length, "5", Sign.NotNegative),
            "distance up to which joined points count as coinciding; 5 mm by default") { Default = "5 mm" },
        new("operations", new NamedKind("operation", new ShapeKind(Operation), MakesFileNames: true), "running conditions"),
        new("responses", new NamedKind("response", new ShapeKind(Response), MakesFileNames: true), "dofs that somebody cares about"),
        new("targets", new NamedKind("target", new ShapeKind(Target)), "limits on responses"),
    ]);
}
