namespace Boltup.Config.Binding;

/// <summary>A number without unit.</summary>
/// <param name="Example">A typical value as written.</param>
public sealed record NumberKind(string Example, Sign Sign = Sign.Any, bool IsInteger = false) : ValueKind
{
    public override string Expected => $"{(IsInteger ? "a whole number" : "a number")} such as `{Example}`";
}
