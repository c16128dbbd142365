using System.Diagnostics.CodeAnalysis;

namespace Boltup.Engine.Spectra;

/// <summary>A degree of freedom of one part: a point and a direction, written <c>point.direction</c> such as <c>m1.z</c>.</summary>
/// <remarks>
/// Inside a part and its data files the direction is along the point's own axes; in an assembly it is along the axes of the assembly.
/// </remarks>
public sealed record Dof(string Point, Direction Direction) : IComparable<Dof>
{
    private static readonly string[] DirectionNames = ["x", "y", "z", "rx", "ry", "rz", "p", "q"];

    public bool IsTranslation => Direction <= Direction.Z;

    public bool IsRotation => Direction is >= Direction.RX and <= Direction.RZ;

    public bool IsMotion => Direction <= Direction.RZ;

    /// <summary>The lower-case name of a direction as files write it.</summary>
    public static string NameOf(Direction direction) => DirectionNames[(int)direction];

    public static bool TryParseDirection(ReadOnlySpan<char> text, out Direction direction)
    {
        for (int i = 0; i < DirectionNames.Length; i++)
        {
            if (text.SequenceEqual(DirectionNames[i]))
            {
                direction = (Direction)i;
                return true;
            }
        }

        direction = default;
        return false;
    }

    /// <summary>Reads <c>point.direction</c>; the point is everything before the last full stop.</summary>
    public static bool TryParse([NotNullWhen(true)] string? text, [NotNullWhen(true)] out Dof? dof)
    {
        int stop = text?.LastIndexOf('.') ?? -1;
        if (stop > 0 && TryParseDirection(text.AsSpan(stop + 1), out Direction direction))
        {
            dof = new Dof(text![..stop], direction);
            return true;
        }

        dof = null;
        return false;
    }

    /// <summary>Reads <c>point.direction</c>; for literals in code and tests.</summary>
    /// <exception cref="FormatException">The text is no dof.</exception>
    public static Dof Parse(string text) =>
        TryParse(text, out Dof? dof) ? dof : throw new FormatException($"`{text}` is no dof of the form point.direction");

    public int CompareTo(Dof? other)
    {
        if (other is null)
        {
            return 1;
        }

        int byPoint = string.CompareOrdinal(Point, other.Point);
        return byPoint != 0 ? byPoint : Direction.CompareTo(other.Direction);
    }

    public override string ToString() => $"{Point}.{NameOf(Direction)}";
}
