namespace Boltup.Config.Binding;

/// <summary>The path of a file, relative to the document that names it.</summary>
/// <param name="What">What the file is, with article.</param>
public sealed record PathKind(string What) : ValueKind
{
    public override string Expected => $"the path of {What}";
}
