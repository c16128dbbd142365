namespace Boltup.Config;

/// <summary>The kinds of document that this version reads.</summary>
public enum DocumentKind
{
    Part,
    Assembly,
    Bench,
    Forces,
    Pins,
}
