using Boltup.Config.Binding;
using Boltup.Config.Units;

namespace Boltup.Config.Documents;

/// <summary>The keys of a bench document.</summary>
public static class BenchShape
{
    private static readonly PathKind SpectraFile = new("a file of spectra");
    private static readonly ListKind PointNames = new(new TextKind("the name of a point"), Minimum: 1, IsSet: true);
    private static readonly ChoiceKind Motion = new("acceleration", "velocity", "displacement");
    private static readonly ChoiceKind Amplitudes = new("rms", "peak");

    private static readonly Shape Interface = new("an interface",
    [
        new("points", PointNames, "points of the source where it is fastened", IsRequired: true),
        new("directions", new ListKind(SharedKinds.MotionDirection, Minimum: 1, IsSet: true), "directions of the forces, the same at every point", IsRequired: true),
        new("mounts_belong_to", new ChoiceKind("source", "receiver"),
            "whether the points are below the mounts, which are then part of the source, or above them"),
    ]);

    private static readonly Shape FrfFile = new("an FRF file",
    [
        new("file", new PathKind("an FRF file"), "Universal File or FRF CSV", IsRequired: true),
        new("quantity", new ChoiceKind("receptance", "mobility", "accelerance"), "what the motion rows of the file are"),
        new("coherence", new PathKind("a file of coherences"), "ordinary coherence of the same FRFs"),
        new("averages", new NumberKind("10", Sign.Positive, IsInteger: true), "number of averages of the FRFs"),
    ],
    KeyRule.Needs("averages", "coherence"), KeyRule.Needs("coherence", "averages"));

    private static readonly Shape Spectra = new("measured spectra",
    [
        new("file", SpectraFile, "spectra of the sensors with one phase reference"),
        new("runs", new ListKind(SpectraFile, Minimum: 2, IsSet: true), "the same, measured several times"),
        new("phase", new ChoiceKind("common", "free"), "whether the runs have one phase reference"),
        new("cross_spectra", new PathKind("a file of auto and cross spectra"), "auto and cross spectra of the sensors"),
        new("quantity", Motion, "what the motion spectra are, where the file does not say"),
        new("amplitude", Amplitudes, "what the magnitudes in the file are"),
    ],
    KeyRule.ExactlyOne("file", "runs", "cross_spectra"), KeyRule.Needs("runs", "phase"), KeyRule.Needs("phase", "runs"));

    private static readonly Shape Solve = new("a choice of method",
    [
        new("method", new ChoiceKind("least_squares", "truncated", "tikhonov"), "how the FRFs are inverted", IsRequired: true),
        new("below", new NumberKind("0.01", Sign.Positive),
            "truncated: share of the largest singular value below which values are left out; by default the noise of the FRFs decides"),
        new("damping", new NumberKind("0.01", Sign.Positive), "tikhonov: λ as a share of the largest singular value"),
        new("damping_by", new ChoiceKind("gcv", "l_curve"), "tikhonov: how λ is found at each line"),
    ]);

    private static readonly Shape Model = new("the bench as an assembly",
    [
        new("assembly", new PathKind("an assembly file"), "source, mounts and bench as parts and joints", IsRequired: true),
        new("source", new TextKind("the name of a part"), "the part of it that is the source", IsRequired: true),
    ]);

    private static readonly Shape Second = new("another installation",
    [
        new("title", new TextKind("a title"), "what it is"),
        new("installed_frf", new ListKind(new ShapeKind(FrfFile), Minimum: 1), "FRFs from the interface to its sensors, source off", IsRequired: true),
        new("sensors", PointNames, "points whose spectra are predicted", IsRequired: true),
        new("operations", new NamedKind("operation", new ShapeKind(Spectra), Minimum: 1),
            "what its sensors measured, by the names of the bench's operations", IsRequired: true),
    ]);

    private static readonly Shape Route = new("another route to the forces",
    [
        new("method", new ChoiceKind("mount_stiffness", "contact_force", "free_velocity"), "which route", IsRequired: true),
        new("source", new PathKind("a part file"), "free_velocity: the free source"),
        new("operations", new NamedKind("operation", new ShapeKind(Spectra), Minimum: 1),
            "what was measured for it, by the names of the bench's operations", IsRequired: true),
    ]);

    public static readonly Shape Root = new("a bench",
    [
        new("boltup", new ChoiceKind("bench/1"), "kind and version of the document", IsRequired: true),
        new("title", new TextKind("a title"), "what the bench is"),
        new("frequencies", new ShapeKind(SharedKinds.Frequencies), "lines to compute; by default those that all data share"),
        new("points", new NamedKind("point", new ShapeKind(SharedKinds.Point), IsDotted: true, Minimum: 1), "named places on source and bench", IsRequired: true),
        new("virtual_points", VirtualPointShape.Named, "points of six dofs with sensors and impacts around them"),
        new("interface", new ShapeKind(Interface), "where the blocked forces act", IsRequired: true),
        new("installed_frf", new ListKind(new ShapeKind(FrfFile), Minimum: 1), "FRFs from interface dofs to all sensors, source installed and off", IsRequired: true),
        new("indicators", PointNames, "sensors from which the forces are identified", IsRequired: true),
        new("validation", PointNames, "sensors that take no part in the identification"),
        new("operations", new NamedKind("operation", new ShapeKind(Spectra), MakesFileNames: true, Minimum: 1),
            "what the sensors measured with the source running", IsRequired: true),
        new("solve", new ShapeKind(Solve), "how the FRFs are inverted; plain least squares by default"),
        new("second_installation", new ShapeKind(Second), "another receiver, to see whether the forces transfer"),
        new("model", new ShapeKind(Model), "the bench as an assembly, to see whether it is stiff enough"),
        new("routes", new NamedKind("route", new ShapeKind(Route), MakesFileNames: true), "other ways to the forces, to compare with"),
    ]);
}
