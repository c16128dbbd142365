using System.Numerics;
using Boltup.Engine.Coupling;
using Boltup.Engine.Geometry;
using Boltup.Engine.Mounts;
using Boltup.Engine.Parts;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;
using Boltup.Tests.Engine.Paths;

namespace Boltup.Tests.Engine.Sensitivity;

/// <summary>An invented assembly in three directions.</summary>
internal static class Triaxial
{
    public static readonly FrequencyAxis Axis = FrequencyAxis.Even(10, 7, 21);
    public static readonly Direction[] Directions = [Direction.X, Direction.Y, Direction.Z];

    private static readonly double[,] Coupled = { { 3e5, 4e4, 1e4 }, { 4e4, 2e5, 2e4 }, { 1e4, 2e4, 4e5 } };
    private static readonly double[] Dampers = [1, 2, 3];
    private static readonly string[] Points = ["1", "2"];

    public static DiagonalMount Springs() => new([.. Directions.Select((direction, i) => new SpringDamper(direction, 2e5 * (1 + i), 0.1 + 0.05 * i, 4))]);

    public static MatrixMount Matrix() => new(Directions, Coupled, 0.15, Dampers);

    /// <summary>Two parts of invented FRFs on two mounts, two forces; responses on the receiver, one of them at a joined point.</summary>
    public static AssemblyModel Of(
        MountLaw? mount = null, double force = 1, (string Part, string Point, string Direction, double Factor)? row = null, ForceSum sum = ForceSum.Phase)
    {
        Joint[] joints = [.. Points.Select(point => Joint.Through(
            mount ?? Springs(), point, new JointEnd("source", point), new JointEnd("receiver", point)) with { MountName = "m" })];
        Dof[] dofs = [new("1", Direction.Y), new("2", Direction.Z)];
        ForceSet[] forces = [.. dofs.Select((dof, i) => new ForceSet(
            ForceKind.Blocked, "source", Axis, [dof], [[.. Enumerable.Repeat(i == 0 ? new Complex(force, 0.5 * force) : new Complex(0.3, -1), Axis.Count)]]))];
        Response[] responses =
        [
            new("far", "receiver", new Dof("2", Direction.RZ), Quantity.Acceleration),
            new("near", "receiver", new Dof("2", Direction.Y), Quantity.Velocity),
        ];
        return new AssemblyModel(
            "triaxial", Axis, [Placed("source", 1, row), Placed("receiver", 2, row)], joints, [new Operation("run", sum, Amplitude.Rms, forces)], responses);
    }

    private static PlacedPart Placed(string name, int seed, (string Part, string Point, string Direction, double Factor)? row)
    {
        IPartModel model = new InventedPart(seed);
        return new PlacedPart(
            name, row is { } scaled && scaled.Part == name ? new ScaledRow(model, $"{scaled.Point}.{scaled.Direction}", scaled.Factor) : model, [], Rotation.None, Vector3d.Zero);
    }
}
