using Boltup.Engine.Geometry;
using Boltup.Engine.Parts;

namespace Boltup.Engine.Coupling;

/// <summary>The length by which rotations are scaled before a condition number is quoted.</summary>
internal static class LengthScale
{
    /// <summary>Used where no positions are known, or all joints sit in one place.</summary>
    private const double DefaultLength = 0.1;

    /// <summary>Root mean square distance of the joints from their centre in m.</summary>
    public static double Of(IReadOnlyList<PlacedPart> parts, IReadOnlyList<Joint> joints)
    {
        Vector3d[] places = [.. joints.Select(joint => PositionOf(joint, parts)).OfType<Vector3d>()];
        if (places.Length < 2)
        {
            return DefaultLength;
        }

        Vector3d centre = 1.0 / places.Length * places.Aggregate((a, b) => a + b);
        double radius = Math.Sqrt(places.Average(place => (place - centre).Dot(place - centre)));
        return radius > 0 ? radius : DefaultLength;
    }

    private static Vector3d? PositionOf(Joint joint, IReadOnlyList<PlacedPart> parts) =>
        PositionOf(joint.First, parts) ?? PositionOf(joint.Second, parts);

    private static Vector3d? PositionOf(JointEnd end, IReadOnlyList<PlacedPart> parts) =>
        end.IsGround ? null : parts.First(part => part.Name == end.Part).PositionOf(end.Point);
}
