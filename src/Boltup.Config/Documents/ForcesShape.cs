using Boltup.Config.Binding;
using Boltup.Config.Units;

namespace Boltup.Config.Documents;

/// <summary>The keys of a handover of blocked forces: what goes from the supplier of a source to those who build it in.</summary>
public static class ForcesShape
{
    private static readonly Shape Holds = new("a band",
    [
        new("from", new QuantityKind(Dimension.Frequency, "20", Sign.NotNegative), "first frequency at which the forces hold", IsRequired: true),
        new("to", new QuantityKind(Dimension.Frequency, "1000", Sign.Positive), "last one", IsRequired: true),
        new("because", new TextKind("a reason"), "why the band ends there") { IsRemark = true },
    ]);

    private static readonly Shape Operation = new("the forces of an operation",
    [
        new("file", new PathKind("a force file"), "CSV or Universal File of blocked forces, or of their auto and cross spectra", IsRequired: true),
        new("phase", new ChoiceKind("common", "free"), "spectra with one phase reference, or auto and cross spectra", IsRequired: true),
        new("amplitude", new ChoiceKind("rms", "peak"), "what the magnitudes in the file are", IsRequired: true),
        new("scatter", new PathKind("a file of deviations"), "standard deviation of the magnitudes over runs") { IsRemark = true },
        new("validation", new TextKind("a statement"), "which check was made of them, and its figures") { IsRemark = true },
    ]);

    private static readonly Shape Input = new("a fingerprint",
    [
        new("file", new TextKind("a path"), "input of the identification", IsRequired: true),
        new("sha256", new TextKind("64 hexadecimal digits"), "its SHA-256", IsRequired: true),
    ]);

    public static readonly Shape Root = new("a handover of blocked forces",
    [
        new("boltup", new ChoiceKind("forces/1"), "kind and version of the document", IsRequired: true),
        new("title", new TextKind("a title"), "the bench they come from") { IsRemark = true },
        new("obtained_by", new TextKind("a method"), "how they were found") { IsRemark = true },
        new("sign", new TextKind("a convention"), "what a positive force is") { IsRemark = true },
        new("mounts_belong_to", new ChoiceKind("source", "receiver"),
            "whether the forces act below the mounts, which are then part of the source, or above them"),
        new("points", new NamedKind("point", new ShapeKind(SharedKinds.Point), IsDotted: true, Minimum: 1), "where they act", IsRequired: true),
        new("directions", new ListKind(SharedKinds.MotionDirection, IsSet: true), "in which directions, along the axes of each point", IsRequired: true),
        new("holds", new ShapeKind(Holds), "the band in which they hold", IsRequired: true),
        new("operations", new NamedKind("operation", new ShapeKind(Operation), Minimum: 1), "the forces", IsRequired: true),
        new("inputs", new ListKind(new ShapeKind(Input), Minimum: 0), "fingerprints of what they were made from") { IsRemark = true },
    ]);
}
