using Boltup.Config.Binding;

namespace Boltup.Config.Documents;

/// <summary>The keys of a pins document.</summary>
public static class PinsShape
{
    private static readonly Shape Pin = new("a pin",
    [
        new("file", new PathKind("a data file"), "the data file", IsRequired: true),
        new("sha256", new TextKind("64 hexadecimal digits"), "its SHA-256", IsRequired: true),
    ]);

    public static readonly Shape Root = new("pins",
    [
        new("boltup", new ChoiceKind("pins/1"), "kind and version of the document", IsRequired: true),
        new("assembly", new TextKind("the file name of an assembly"), "the assembly beside it whose data files are pinned", IsRequired: true),
        new("files", new ListKind(new ShapeKind(Pin), Minimum: 0), "every data file that the assembly reads", IsRequired: true),
    ]);
}
