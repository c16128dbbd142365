namespace Boltup.Config.Binding;

/// <summary>A map with known keys.</summary>
public sealed record ShapeKind(Shape Shape) : ValueKind
{
    public override string Expected => $"a map with keys such as `{Shape.Keys[0].Name}`";
}
