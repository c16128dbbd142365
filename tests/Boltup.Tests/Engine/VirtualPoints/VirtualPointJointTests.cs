using Boltup.Engine.Coupling;
using Boltup.Engine.Geometry;
using Boltup.Engine.Parts;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;
using Boltup.Engine.VirtualPoints;
using Boltup.Tests.Support;

namespace Boltup.Tests.Engine.VirtualPoints;

public class VirtualPointJointTests
{
    private static readonly Vector3d Place = new(0.013, -0.021, 0.034);
    private static readonly Direction[] Six = [Direction.X, Direction.Y, Direction.Z, Direction.RX, Direction.RY, Direction.RZ];

    /// <summary>
    /// Two equal rigid bodies in the same place are, when joined in six dofs anywhere, one of twice the mass and inertia: every receptance is
    /// half that of one alone. The axes of their virtual points differ.
    /// </summary>
    [Theory]
    [InlineData("s2.x", "h1.y")]
    [InlineData("s4.z", "h3.x")]
    public void Predict_TwoEqualBodiesJoinedInSixDofs_AreOneTwiceAsHeavy(string at, string by)
    {
        PlacedPart[] parts = [Body("one", Rotation.None), Body("other", Rotation.About(new Vector3d(0.36, 0.48, 0.8), 0.7))];
        PredictionResult alone = Predict(parts[..1], [], at, by);
        PredictionResult joined = Predict(parts, [Joint.Rigid("joint", new JointEnd("one", "v"), new JointEnd("other", "v"), Six)], at, by);
        Near.Equal([.. alone.Spectrum().Select(value => value / 2)], joined.Spectrum(), 1e-9);
    }

    private static PredictionResult Predict(PlacedPart[] parts, Joint[] joints, string at, string by)
    {
        FrequencyAxis axis = parts[0].Model.Axis!;
        Dof hit = Dof.Parse(by);
        var force = new ForceSet(ForceKind.Applied, "one", axis, [hit], [[.. Enumerable.Repeat(System.Numerics.Complex.One, axis.Count)]]);
        return Chain.Predict(axis, parts, joints, [force], new Response("response", "one", Dof.Parse(at), Quantity.Displacement));
    }

    private static PlacedPart Body(string name, Rotation axes)
    {
        var body = new RigidBody();
        return new PlacedPart(
            name, new VirtualPointPart(body, [body.Point(Place, axes)]), [new PartPoint("v", Place, axes)], Rotation.None, Vector3d.Zero);
    }
}
