namespace Boltup.Config.Binding;

/// <summary>The keys that a map may have: the one definition from which validation and schema both come.</summary>
/// <param name="What">What the map describes, with article, such as <c>a mount</c>.</param>
public sealed record Shape(string What, IReadOnlyList<KeyDefinition> Keys, params IReadOnlyList<KeyRule> Rules)
{
    public KeyDefinition? Find(string name) => Keys.FirstOrDefault(key => key.Name == name);
}
