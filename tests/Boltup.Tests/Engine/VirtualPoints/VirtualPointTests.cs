using System.Numerics;
using Boltup.Engine;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Geometry;
using Boltup.Engine.Parts;
using Boltup.Engine.Spectra;
using Boltup.Engine.VirtualPoints;
using Boltup.Tests.Support;

namespace Boltup.Tests.Engine.VirtualPoints;

public class VirtualPointTests
{
    private const double Exact = 1e-10;

    private static readonly Vector3d Place = new(0.013, -0.021, 0.034);
    private static readonly Rotation Turned = Rotation.About(new Vector3d(0.36, 0.48, 0.8), 0.7);

    private readonly DiagnosticBag _diagnostics = new();

    /// <summary>Every entry of the six-dof FRF of the body at the point, in turned axes, from turned sensors.</summary>
    [Fact]
    public void Evaluate_RigidBody_IsItsExactSixDofFrf()
    {
        var body = new RigidBody(Rotation.About(new Vector3d(0, 0, 1), 0.3));
        FrfMatrix frf = Virtual(body, body.Point(Place, Turned));
        for (int i = 0; i < 36; i++)
        {
            (int row, int column) = Math.DivRem(i, 6);
            Complex expected = RigidBody.Receptance(
                body.Axis.Omega(4), Place, Translation(row), Rotating(row), Place, Translation(column), Rotating(column));
            Assert.Equal(0, (expected - frf[4, row, column]).Magnitude, Exact * Scale(frf, row, column));
        }
    }

    /// <summary>Entries that are zero in theory are round-off in the data: no reason to call the body not reciprocal.</summary>
    [Fact]
    public void Judge_SixDofFrfOfARigidBody_IsReciprocal()
    {
        var body = new RigidBody();
        FrfQuality.Judge("body", null, FrfQuality.Measure(Virtual(body, body.Point(Vector3d.Zero, Rotation.None))), _diagnostics);
        Assert.Empty(_diagnostics.Items);
    }

    /// <summary>Hand-computed: a sensor 0.1 m along x sees +0.1 m of its z motion for −1 rad about y, and of its y motion for +1 rad about z.</summary>
    [Fact]
    public void Rows_SensorOffThePoint_FollowTheRightHand()
    {
        var channels = new[] { new Vector3d(1, 0, 0), new Vector3d(0, 1, 0), new Vector3d(0, 0, 1) }
            .Select((along, i) => new MeasuredChannel(new Dof("s", (Direction)i), new Vector3d(0.1, 0, 0), along, 1)).ToArray();
        var transform = new RigidTransform(new VirtualPoint("v", Vector3d.Zero, Rotation.None, channels, []), channels);
        Assert.Equal([1, 0, 0, 0, 0, 0], transform.Rows.Row(0));
        Assert.Equal([0, 1, 0, 0, 0, 0.1], transform.Rows.Row(1));
        Assert.Equal([0, 0, 1, 0, -0.1, 0], transform.Rows.Row(2));
    }

    [Fact]
    public void Rows_AllChannelsMovedWithThePoint_StayTheSame()
    {
        var body = new RigidBody();
        VirtualPoint point = body.Point(Place, Turned);
        var offset = new Vector3d(3, -2, 5);
        VirtualPoint moved = point with
        {
            At = point.At + offset,
            Sensors = [.. point.Sensors.Select(channel => channel with { At = channel.At + offset })],
        };
        double difference = (new RigidTransform(point, point.Sensors).Rows - new RigidTransform(moved, moved.Sensors).Rows).L2Norm();
        Assert.Equal(0, difference, 1e-14);
    }

    [Fact]
    public void Evaluate_ChannelsInAnotherOrder_GivesTheSame()
    {
        var body = new RigidBody();
        VirtualPoint point = body.Point(Place, Turned);
        FrfMatrix first = Virtual(body, point), second = Virtual(body, point with { Sensors = [.. point.Sensors.Reverse()], Impacts = [.. point.Impacts.Reverse()] });
        Assert.All(Enumerable.Range(0, 36), i => Near.Equal(first[2, i / 6, i % 6], second[2, i / 6, i % 6], 1e-9));
    }

    [Fact]
    public void Measure_RigidBody_IsFullyConsistent()
    {
        var body = new RigidBody();
        IReadOnlyList<VirtualPointQuality> qualities = VirtualPointCheck.Measure(body, body.Point(Place, Rotation.None), body.Axis, _diagnostics);
        Assert.Equal([false, true], qualities.Select(quality => quality.OfImpacts));
        Assert.All(qualities, quality => Assert.Equal(1, quality.Overall, 1e-12));
        Assert.All(qualities, quality => Assert.All(quality.Channels, channel => Assert.Equal(1, channel.Consistency, 1e-12)));
    }

    [Theory]
    [InlineData("s2.y")]
    [InlineData("s4.x")]
    public void Judge_FlippedSensor_IsNamed(string channel)
    {
        var body = new RigidBody();
        body.Flip(Dof.Parse(channel));
        VirtualPointQuality quality = VirtualPointCheck.Measure(body, body.Point(Place, Rotation.None), body.Axis, _diagnostics)[0];
        VirtualPointCheck.Judge(quality, null, _diagnostics);
        Diagnostic warning = Assert.Single(_diagnostics.Items);
        Assert.Equal(EngineCodes.ChannelNotRigid, warning.Code);
        Assert.Contains($"`{channel}`", warning.Message, StringComparison.Ordinal);
        Assert.True(quality.Overall < 0.95);
    }

    /// <summary>Six channels fit perfectly with a flipped one too, which is why they prove nothing.</summary>
    [Fact]
    public void Measure_ExactlySixChannels_AreConsistentWhateverTheySayAndWarn()
    {
        var body = new RigidBody();
        body.Flip(Dof.Parse("s1.y"));
        VirtualPoint point = body.Point(Place, Rotation.None);
        point = point with { Sensors = [.. point.Sensors.Where((_, i) => i is 0 or 1 or 2 or 4 or 5 or 9)], Impacts = [] };
        Assert.True(VirtualPointCheck.SeesAllMotions(point, null, _diagnostics));
        Assert.Equal(EngineCodes.ExactlyDetermined, Assert.Single(_diagnostics.Items).Code);
        VirtualPointQuality quality = VirtualPointCheck.Measure(body, point, body.Axis, _diagnostics)[0];
        Assert.Equal(1, quality.Overall, 1e-9);
        Assert.True(quality.IsExactlyDetermined);
    }

    [Fact]
    public void SeesAllMotions_SensorsOnOneLine_NamesTheMotionThatIsMissing()
    {
        MeasuredChannel[] channels = [.. Enumerable.Range(0, 9).Select(i => new MeasuredChannel(
            new Dof($"s{i / 3}", (Direction)(i % 3)),
            new Vector3d(0.1 * (i / 3), 0, 0),
            (i % 3) switch { 0 => new Vector3d(1, 0, 0), 1 => new Vector3d(0, 1, 0), _ => new Vector3d(0, 0, 1) },
            1))];
        Assert.False(VirtualPointCheck.SeesAllMotions(new VirtualPoint("v", Vector3d.Zero, Rotation.None, channels, []), null, _diagnostics));
        Assert.Contains("rotation about x", Assert.Single(_diagnostics.Items).Message, StringComparison.Ordinal);
    }

    private FrfMatrix Virtual(RigidBody body, VirtualPoint point)
    {
        var part = new VirtualPointPart(body, [point]);
        Dof[] dofs = [.. Enumerable.Range(0, 6).Select(i => new Dof("v", (Direction)i))];
        Assert.True(part.HasFrf(dofs[0], dofs[5]));
        return part.Evaluate(body.Axis, dofs, dofs, _diagnostics)!;
    }

    private static double Scale(FrfMatrix frf, int row, int column) =>
        Math.Sqrt(frf[4, row, row].Magnitude * frf[4, column, column].Magnitude);

    private static Vector3d Axis(int dof) => (dof % 3) switch { 0 => Turned.X, 1 => Turned.Y, _ => Turned.Z };

    private static Vector3d Translation(int dof) => dof < 3 ? Axis(dof) : Vector3d.Zero;

    private static Vector3d Rotating(int dof) => dof < 3 ? Vector3d.Zero : Axis(dof);
}
