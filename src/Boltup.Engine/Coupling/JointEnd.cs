namespace Boltup.Engine.Coupling;

/// <summary>One side of a joint: a point of a part, or the immovable ground.</summary>
/// <param name="Part">Name of the part, or null for the ground.</param>
/// <param name="Point">Name of the point; empty for the ground.</param>
public sealed record JointEnd(string? Part, string Point)
{
    public static readonly JointEnd Ground = new(null, "");

    public bool IsGround => Part is null;

    public override string ToString() => IsGround ? "ground" : $"{Part}.{Point}";
}
