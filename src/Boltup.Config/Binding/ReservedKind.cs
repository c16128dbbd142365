namespace Boltup.Config.Binding;

/// <summary>A value that a later version of the program will read.</summary>
/// <param name="AllowsEmpty">Whether an empty map may stand there already now.</param>
public sealed record ReservedKind(bool AllowsEmpty = false) : ValueKind
{
    public override string Expected => AllowsEmpty ? "an empty map `{}`" : "nothing yet";
}
