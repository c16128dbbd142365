namespace Boltup.Config.Binding;

/// <summary>
/// A square list of rows over x, y, z or over x, y, z, rx, ry, rz. Translations are stiffnesses, rotations rotational
/// stiffnesses, the entries between them force per angle; a bare <c>0</c> is zero in any unit.
/// </summary>
public sealed record StiffnessMatrixKind : ValueKind
{
    public override string Expected => "a list of 3 rows of 3 stiffnesses, or 6 rows of 6";
}
