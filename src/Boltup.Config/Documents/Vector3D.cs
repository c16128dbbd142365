namespace Boltup.Config.Documents;

/// <summary>A vector in space; positions are in metres.</summary>
public readonly record struct Vector3D(double X, double Y, double Z)
{
    public double Length => Math.Sqrt(Dot(this));

    public double Dot(Vector3D other) => X * other.X + Y * other.Y + Z * other.Z;

    public Vector3D Cross(Vector3D other) => new(
        Y * other.Z - Z * other.Y,
        Z * other.X - X * other.Z,
        X * other.Y - Y * other.X);

    public static Vector3D operator /(Vector3D vector, double divisor) =>
        new(vector.X / divisor, vector.Y / divisor, vector.Z / divisor);
}
