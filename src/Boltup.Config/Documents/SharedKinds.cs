using Boltup.Config.Binding;
using Boltup.Config.Units;

namespace Boltup.Config.Documents;

/// <summary>Kinds of value that several documents have.</summary>
internal static class SharedKinds
{
    /// <summary>Three lengths.</summary>
    public static readonly ListKind Position = new(new QuantityKind(Dimension.Length, "92"), 3, 3);

    /// <summary>Directions in which something can move.</summary>
    public static readonly ChoiceKind MotionDirection = new("x", "y", "z", "rx", "ry", "rz");

    /// <summary>Evenly spaced lines.</summary>
    public static readonly Shape Frequencies = new("a frequency range",
    [
        new("from", new QuantityKind(Dimension.Frequency, "20", Sign.NotNegative), "first line", IsRequired: true),
        new("to", new QuantityKind(Dimension.Frequency, "2000", Sign.Positive), "last line", IsRequired: true),
        new("step", new QuantityKind(Dimension.Frequency, "1", Sign.Positive), "distance of the lines", IsRequired: true),
    ]);

    /// <summary>A map from directions to quantities, of one dimension for translations and another for rotations.</summary>
    public static ShapeKind PerDirection(string what, string example, Dimension translation, Dimension rotation) => new(new Shape(what,
        [.. MotionDirection.Allowed.Select(name =>
            new KeyDefinition(
                name, new QuantityKind(name.Length == 1 ? translation : rotation, example, Sign.NotNegative), $"{what} along {name}"))]));
}
