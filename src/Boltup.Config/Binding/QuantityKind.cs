using Boltup.Config.Units;

namespace Boltup.Config.Binding;

/// <summary>A number with a unit.</summary>
/// <param name="Example">A typical number as written; the customary unit is added to it.</param>
public sealed record QuantityKind(Dimension Dimension, string Example, Sign Sign = Sign.Any) : ValueKind
{
    public override string Expected => $"{Dimension.Name} such as `{Example} {Dimension.CustomaryUnit}`";
}
