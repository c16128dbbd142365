namespace Boltup.Config.Binding;

/// <summary>A key that a map may have.</summary>
/// <param name="Doc">One line for people: what it is.</param>
public sealed record KeyDefinition(string Name, ValueKind Kind, string Doc, bool IsRequired = false);
