namespace Boltup.Config.Binding;

/// <summary>A condition on which keys a map has together.</summary>
public sealed record KeyRule(KeyRuleKind Kind, IReadOnlyList<string> Keys)
{
    /// <summary>Exactly one of the keys is there.</summary>
    public static KeyRule ExactlyOne(params string[] keys) => new(KeyRuleKind.ExactlyOne, keys);

    /// <summary>At least one of the keys is there.</summary>
    public static KeyRule AtLeastOne(params string[] keys) => new(KeyRuleKind.AtLeastOne, keys);

    /// <summary>No two of the keys are there.</summary>
    public static KeyRule AtMostOne(params string[] keys) => new(KeyRuleKind.AtMostOne, keys);

    /// <summary>Where the first key is, one of the others is too.</summary>
    public static KeyRule Needs(string key, params string[] oneOf) => new(KeyRuleKind.Needs, [key, .. oneOf]);
}
