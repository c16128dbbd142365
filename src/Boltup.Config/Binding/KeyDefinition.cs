namespace Boltup.Config.Binding;

/// <summary>A key that a map may have.</summary>
/// <param name="Doc">One line for people: what it is.</param>
public sealed record KeyDefinition(string Name, ValueKind Kind, string Doc, bool IsRequired = false)
{
    /// <summary>What holds where the key is not given, as a document would write it; null where nothing does.</summary>
    public string? Default { get; init; }

    /// <summary>Whether it is for people only: no result depends on it.</summary>
    public bool IsRemark { get; init; }
}
