namespace Boltup.Engine.Geometry;

/// <summary>
/// A proper rotation. Its three vectors are the turned x, y and z axes, so that a vector with components c in the turned axes
/// is c.X·X + c.Y·Y + c.Z·Z in the fixed ones.
/// </summary>
public sealed record Rotation(Vector3d X, Vector3d Y, Vector3d Z)
{
    /// <summary>Components below this are zero: 90° turns given in degrees are exact to 1e-16.</summary>
    private const double Negligible = 1e-12;

    public static readonly Rotation None = new(new(1, 0, 0), new(0, 1, 0), new(0, 0, 1));

    public bool IsNone => this == None;

    /// <summary>Turn about an axis, right-handed; Rodrigues' formula.</summary>
    /// <param name="axis">Any length but zero.</param>
    /// <param name="angle">In rad.</param>
    public static Rotation About(Vector3d axis, double angle)
    {
        Vector3d k = axis.Normalised();
        (double sin, double cos) = Math.SinCos(angle);
        Vector3d Turn(Vector3d v) => Clean(cos * v + sin * k.Cross(v) + (1 - cos) * k.Dot(v) * k);
        return new Rotation(Turn(None.X), Turn(None.Y), Turn(None.Z));
    }

    /// <summary>Components in the fixed axes of a vector given in the turned axes.</summary>
    public Vector3d Apply(Vector3d turned) => Clean(turned.X * X + turned.Y * Y + turned.Z * Z);

    /// <summary>Components in the turned axes of a vector given in the fixed axes.</summary>
    public Vector3d Resolve(Vector3d fixedAxes) => Clean(new Vector3d(X.Dot(fixedAxes), Y.Dot(fixedAxes), Z.Dot(fixedAxes)));

    private static Vector3d Clean(Vector3d v) => new(Clean(v.X), Clean(v.Y), Clean(v.Z));

    private static double Clean(double component) =>
        Math.Abs(component) < Negligible ? 0 : Math.Abs(Math.Abs(component) - 1) < Negligible ? Math.Sign(component) : component;
}
