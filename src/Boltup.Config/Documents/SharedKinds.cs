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

    private static readonly ListKind Components = new(new NumberKind("1"), 3, 3);

    /// <summary>Own axes of a point.</summary>
    public static readonly Shape Axes = new("the axes of a point",
    [
        new("x", Components, "direction of the point's x axis in the axes of the part"),
        new("y", Components, "direction of the point's y axis in the axes of the part"),
        new("z", Components, "direction of the point's z axis in the axes of the part"),
    ]);

    /// <summary>A named place.</summary>
    public static readonly Shape Point = new("a point",
    [
        new("node", new NumberKind("101", IsInteger: true), "number of the point in a Universal File"),
        new("at", Position, "position in the axes of the part"),
        new("axes", new ShapeKind(Axes), "own axes of the point: two of x, y, z, the third completes a right-handed set"),
    ]);

    /// <summary>Evenly spaced lines.</summary>
    public static readonly Shape Frequencies = new("a frequency range",
    [
        new("from", new QuantityKind(Dimension.Frequency, "20", Sign.NotNegative), "first line", IsRequired: true),
        new("to", new QuantityKind(Dimension.Frequency, "2000", Sign.Positive), "last line", IsRequired: true),
        new("step", new QuantityKind(Dimension.Frequency, "1", Sign.Positive), "distance of the lines", IsRequired: true),
    ]);

    /// <summary>A map from directions to quantities, of one dimension for translations and another for rotations.</summary>
    public static ShapeKind PerDirection(string what, string example, Dimension translation, Dimension rotation)
    {
        Dimension DimensionOf(string name) => name.Length == 1 ? translation : rotation;
        return new ShapeKind(new Shape(what, [.. MotionDirection.Allowed.Select(name =>
            new KeyDefinition(
                name, new QuantityKind(DimensionOf(name), example, Sign.NotNegative), $"{what} along {name}")
            { Default = $"0 {DimensionOf(name).SiUnit}" })]));
    }
}
