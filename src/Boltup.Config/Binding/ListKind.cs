namespace Boltup.Config.Binding;

/// <summary>A list of values of one kind.</summary>
/// <param name="IsSet">Whether no text may occur twice.</param>
public sealed record ListKind(ValueKind Item, int Minimum = 1, int Maximum = int.MaxValue, bool IsSet = false) : ValueKind
{
    public override string Expected => Minimum == Maximum
        ? $"a list of {Minimum} items, each {Item.Expected}"
        : $"a list, each item {Item.Expected}";
}
