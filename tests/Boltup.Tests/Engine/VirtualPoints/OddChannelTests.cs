using System.Globalization;
using Boltup.Engine;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Geometry;
using Boltup.Engine.Spectra;
using Boltup.Engine.VirtualPoints;
using CsCheck;

namespace Boltup.Tests.Engine.VirtualPoints;

public class OddChannelTests
{
    private static readonly Vector3d Place = new(0.013, -0.021, 0.034);

    /// <summary>One wrong channel in exact data: the channel is named, whichever it is, and leaving it out leaves no misfit.</summary>
    [Theory]
    [InlineData(-1)]
    [InlineData(0.5)]
    [InlineData(2)]
    [InlineData(9.80665)]
    [InlineData(0.10197)]
    public void Judge_AnyWrongChannel_IsTheOneThatIsNamed(double factor)
    {
        VirtualPoint point = new RigidBody().Point(Place, Rotation.None);
        Assert.All(point.Sensors, sensor => AssertNamed(sensor.Dof, factor, ofImpacts: false));
        Assert.All(point.Impacts, impact => AssertNamed(impact.Dof, factor, ofImpacts: true));
    }

    /// <summary>What a wrong channel is told by does not depend on how it is weighted.</summary>
    [Fact]
    public void Measure_WrongChannelOfAnyWeight_IsFound() =>
        Gen.Double[0.1, 10].Array[12].Select(Gen.Int[0, 11]).Sample(
            (weights, wrong) =>
            {
                var body = new RigidBody();
                VirtualPoint point = body.Point(Place, Rotation.None);
                point = point with { Sensors = [.. point.Sensors.Select((sensor, i) => sensor with { Weight = weights[i] })] };
                body.Scale(point.Sensors[wrong].Dof, 9.80665);
                OddChannel odd = VirtualPointCheck.Measure(body, point, body.Axis, new DiagnosticBag())[0].Odd!;
                return odd.Dof == point.Sensors[wrong].Dof && Math.Abs(odd.Share - 1) < 1e-9;
            },
            iter: 50);

    /// <summary>A gain of g in exact data: consistency (1 + g)²/(2(1 + g²)) by hand, 0.601.</summary>
    [Fact]
    public void Measure_ChannelScaledByG_HasTheConsistencyOfThatFactor()
    {
        var body = new RigidBody();
        body.Scale(Dof.Parse("s3.x"), 9.80665);
        OddChannel odd = VirtualPointCheck.Measure(body, body.Point(Place, Rotation.None), body.Axis, new DiagnosticBag())[0].Odd!;
        Assert.Equal(Math.Pow(10.80665, 2) / (2 * (1 + Math.Pow(9.80665, 2))), odd.Consistency, 1e-9);
    }

    /// <summary>Three triaxial sensors in the plane z = 0: their z alone say z, rx and ry, so that nothing checks them.</summary>
    [Fact]
    public void SeesAllMotions_ThreeSensorsInAPlane_WarnsOfTheirNormals()
    {
        var diagnostics = new DiagnosticBag();
        Assert.True(VirtualPointCheck.SeesAllMotions(new VirtualPoint("v", Vector3d.Zero, Rotation.None, InPlane(), []), null, diagnostics));
        Diagnostic warning = Assert.Single(diagnostics.Items);
        Assert.Equal(EngineCodes.ChannelUnchecked, warning.Code);
        Assert.EndsWith("`s0.z`, `s1.z`, `s2.z`", Assert.Single(warning.Notes), StringComparison.Ordinal);
    }

    private static MeasuredChannel[] InPlane() =>
        [.. Enumerable.Range(0, 9).Select(i => new MeasuredChannel(
            new Dof(string.Create(CultureInfo.InvariantCulture, $"s{i / 3}"), (Direction)(i % 3)),
            new Vector3d(i / 3 == 1 ? 0.1 : 0, i / 3 == 2 ? 0.1 : 0, 0),
            new Vector3d(i % 3 == 0 ? 1 : 0, i % 3 == 1 ? 1 : 0, i % 3 == 2 ? 1 : 0),
            1))];

    private static void AssertNamed(Dof wrong, double factor, bool ofImpacts)
    {
        var body = new RigidBody();
        body.Scale(wrong, factor);
        var diagnostics = new DiagnosticBag();
        VirtualPointQuality quality = VirtualPointCheck.Measure(body, body.Point(Place, Rotation.None), body.Axis, diagnostics)[ofImpacts ? 1 : 0];
        VirtualPointCheck.Judge(quality, null, diagnostics);
        Diagnostic warning = Assert.Single(diagnostics.Items);
        Assert.Equal(EngineCodes.ChannelNotRigid, warning.Code);
        Assert.Contains($"`{wrong}`", warning.Message, StringComparison.Ordinal);
        Assert.Equal(1, quality.Odd!.Share, 1e-9);
    }
}
