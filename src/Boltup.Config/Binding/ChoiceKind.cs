namespace Boltup.Config.Binding;

/// <summary>One of a few words.</summary>
public sealed record ChoiceKind(params IReadOnlyList<string> Allowed) : ValueKind
{
    public override string Expected => Allowed.Count == 1 ? $"`{Allowed[0]}`" : $"one of {Words.List(Allowed)}";
}
