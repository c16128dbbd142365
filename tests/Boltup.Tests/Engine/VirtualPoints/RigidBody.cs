using System.Numerics;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Geometry;
using Boltup.Engine.Parts;
using Boltup.Engine.Spectra;
using Boltup.Engine.VirtualPoints;

namespace Boltup.Tests.Engine.VirtualPoints;

/// <summary>
/// A free rigid body with triaxial sensors and impacts, in closed form: a = F/m + α × r, α = I⁻¹(r × F) about the centre, so that the
/// receptance between directions is −1/ω² times that (any textbook of dynamics). The body's axes are principal axes.
/// </summary>
internal sealed class RigidBody : IPartModel
{
    private static readonly Vector3d Inertia = new(0.02, 0.03, 0.05);
    private const double Mass = 4;

    private readonly Dictionary<string, (Vector3d At, Rotation Axes)> _points = [];
    private readonly Dictionary<Dof, double> _factors = [];

    public RigidBody(Rotation? axes = null)
    {
        Rotation turned = axes ?? Rotation.None;
        Vector3d[] places = [new(0.05, 0.01, 0), new(-0.02, 0.06, 0.01), new(-0.03, -0.04, 0.02), new(0.02, -0.03, -0.03)];
        for (int i = 0; i < places.Length; i++)
        {
            _points[$"s{i + 1}"] = (places[i], turned);
            _points[$"h{i + 1}"] = (0.8 * places[i] + new Vector3d(0.01, 0, 0.02), Rotation.None);
        }
    }

    public FrequencyAxis Axis { get; } = FrequencyAxis.Even(50, 25, 9);

    public IReadOnlyCollection<Dof> Responses => [.. Dofs("s"), .. Dofs("h")];

    public IReadOnlyCollection<Dof> Excitations => Responses;

    public void Flip(Dof dof) => Scale(dof, -1);

    /// <summary>A wrong calibration of a sensor or hammer channel.</summary>
    public void Scale(Dof dof, double factor) => _factors[dof] = factor;

    /// <summary>The point with the first sensors and impacts around it.</summary>
    public VirtualPoint Point(Vector3d at, Rotation axes, int sensors = 4, int impacts = 4) =>
        new("v", at, axes, Channels("s", sensors), Channels("h", impacts));

    /// <summary>Receptance between two channels or dofs of a point, translation or rotation, given as generalised directions.</summary>
    public static Complex Receptance(double omega, Vector3d r1, Vector3d d1, Vector3d m1, Vector3d r2, Vector3d d2, Vector3d m2)
    {
        Vector3d moment = m2 + r2.Cross(d2);
        Vector3d spin = new(moment.X / Inertia.X, moment.Y / Inertia.Y, moment.Z / Inertia.Z);
        Vector3d acceleration = 1 / Mass * d2 + spin.Cross(r1);
        return -(d1.Dot(acceleration) + m1.Dot(spin)) / (omega * omega);
    }

    public bool HasFrf(Dof response, Dof excitation) => _points.ContainsKey(response.Point) && _points.ContainsKey(excitation.Point);

    public FrfMatrix Evaluate(FrequencyAxis axis, IReadOnlyList<Dof> rows, IReadOnlyList<Dof> columns, DiagnosticBag diagnostics)
    {
        var frf = new FrfMatrix(axis, rows, columns);
        for (int i = 0; i < rows.Count * columns.Count; i++)
        {
            Dof row = rows[i / columns.Count], column = columns[i % columns.Count];
            double factor = _factors.GetValueOrDefault(row, 1) * _factors.GetValueOrDefault(column, 1);
            frf.Values.ScatterSpectrum(i / columns.Count, i % columns.Count, [.. Enumerable.Range(0, axis.Count).Select(line => factor * Receptance(
                axis.Omega(line), _points[row.Point].At, Along(row), Vector3d.Zero, _points[column.Point].At, Along(column), Vector3d.Zero))]);
        }

        return frf;
    }

    private Vector3d Along(Dof dof)
    {
        Rotation axes = _points[dof.Point].Axes;
        return dof.Direction switch { Direction.X => axes.X, Direction.Y => axes.Y, _ => axes.Z };
    }

    private IEnumerable<Dof> Dofs(string kind) => _points.Keys.Where(name => name.StartsWith(kind, StringComparison.Ordinal))
        .SelectMany(name => new[] { Direction.X, Direction.Y, Direction.Z }.Select(direction => new Dof(name, direction)));

    private MeasuredChannel[] Channels(string kind, int points) =>
        [.. Dofs(kind).Take(3 * points).Select(dof => new MeasuredChannel(dof, _points[dof.Point].At, Along(dof), 1))];
}
