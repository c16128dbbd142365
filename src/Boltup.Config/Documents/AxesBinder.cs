using Boltup.Config.Binding;
using Boltup.Config.Yaml;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Geometry;

namespace Boltup.Config.Documents;

/// <summary>Completes the axes of a point and checks that they form a right-handed orthonormal set.</summary>
internal static class AxesBinder
{
    /// <summary>Largest difference of a length from 1 and of a scalar product from 0.</summary>
    private const double Tolerance = 1e-6;

    private static readonly string[] Names = ["x", "y", "z"];

    /// <summary>The axes, or null with a diagnostic when they are none.</summary>
    public static Marked<Rotation>? Bind(YamlMap map, DiagnosticBag diagnostics)
    {
        var given = new Marked<Vector3d>?[3];
        for (int i = 0; i < given.Length; i++)
        {
            given[i] = map[Names[i]]?.Vector();
        }

        if (given.Count(axis => axis is not null) < 2)
        {
            diagnostics.Error(ConfigCodes.BadAxes, "axes cannot be completed from one direction", map.Span, "give two of `x`, `y` and `z`");
            return null;
        }

        if (!AreUnitVectors(given, diagnostics) || !ArePerpendicular(given, diagnostics))
        {
            return null;
        }

        return Complete(given, map, diagnostics);
    }

    private static bool AreUnitVectors(Marked<Vector3d>?[] axes, DiagnosticBag diagnostics)
    {
        bool isFine = true;
        for (int i = 0; i < axes.Length; i++)
        {
            if (axes[i] is { } axis && Math.Abs(axis.Value.Length - 1) > Tolerance)
            {
                isFine = false;
                diagnostics.Error(ConfigCodes.BadAxes,
                    FormattableString.Invariant($"axis `{Names[i]}` has the length {axis.Value.Length:G7}, expected 1"),
                    axis.Span, Unit(axis.Value));
            }
        }

        return isFine;
    }

    private static string? Unit(Vector3d axis)
    {
        Vector3d unit = axis.Normalised();
        return double.IsFinite(unit.Length)
            ? FormattableString.Invariant($"write `[{unit.X:0.########}, {unit.Y:0.########}, {unit.Z:0.########}]`")
            : null;
    }

    private static bool ArePerpendicular(Marked<Vector3d>?[] axes, DiagnosticBag diagnostics)
    {
        bool isFine = true;
        for (int i = 0; i < axes.Length; i++)
        {
            int next = (i + 1) % axes.Length;
            if (axes[i] is { } a && axes[next] is { } b && Math.Abs(a.Value.Dot(b.Value)) > Tolerance)
            {
                isFine = false;
                diagnostics.Error(ConfigCodes.BadAxes, $"axes `{Names[i]}` and `{Names[next]}` are not perpendicular", b.Span,
                    notes: FormattableString.Invariant($"their scalar product is {a.Value.Dot(b.Value):G4}, expected 0"));
            }
        }

        return isFine;
    }

    private static Marked<Rotation>? Complete(Marked<Vector3d>?[] given, YamlMap map, DiagnosticBag diagnostics)
    {
        Vector3d x = given[0]?.Value ?? given[1]!.Value.Cross(given[2]!.Value);
        Vector3d y = given[1]?.Value ?? given[2]!.Value.Cross(x);
        Vector3d z = given[2]?.Value ?? x.Cross(y);
        if (x.Cross(y).Dot(z) < 0)
        {
            diagnostics.Error(ConfigCodes.BadAxes, "axes form a left-handed set", map.Span, "leave `z` out, or reverse one of them");
            return null;
        }

        return new(new Rotation(x, y, z), map.Span);
    }
}
