namespace Boltup.Config.Binding;

/// <summary>Which signs a number may have.</summary>
public enum Sign
{
    Any,
    NotNegative,
    Positive,
}
