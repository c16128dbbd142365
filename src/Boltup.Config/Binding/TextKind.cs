namespace Boltup.Config.Binding;

/// <summary>A text that is not empty.</summary>
/// <param name="What">What it is, with article, such as <c>a title</c>.</param>
public sealed record TextKind(string What) : ValueKind
{
    public override string Expected => What;
}
