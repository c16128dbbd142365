namespace Boltup.Config.Binding;

/// <summary>A value that may be written in two ways, told apart by being a single value, a map or a list.</summary>
public sealed record EitherKind(ValueKind First, ValueKind Second) : ValueKind
{
    public override string Expected => $"{First.Expected}, or {Second.Expected}";
}
