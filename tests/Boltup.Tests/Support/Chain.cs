using System.Numerics;
using Boltup.Engine.Coupling;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Geometry;
using Boltup.Engine.Mounts;
using Boltup.Engine.Parts;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;

namespace Boltup.Tests.Support;

/// <summary>Builds small lumped assemblies in the direction x; masses are named 1, 2, … along the chain.</summary>
internal static class Chain
{
    /// <summary>Masses in kg in a row, springs in N/m between neighbours, all with one loss factor.</summary>
    public static PlacedPart Part(
        string name, double[] masses, double[] springs, double lossFactor, (int Mass, double Stiffness)? ground = null)
    {
        List<LumpedLink> links = [.. springs.Select((k, i) => new LumpedLink(i, i + 1, k, lossFactor, 0))];
        if (ground is { } support)
        {
            links.Add(new LumpedLink(support.Mass - 1, null, support.Stiffness, lossFactor, 0));
        }

        return Part(name, masses, [.. links]);
    }

    public static PlacedPart Part(string name, double[] masses, params LumpedLink[] links)
    {
        var model = new LumpedPart(
            name, Direction.X, [.. masses.Select((mass, i) => ((i + 1).ToString(System.Globalization.CultureInfo.InvariantCulture), mass))], links);
        return new PlacedPart(name, model, [], Rotation.None, Vector3d.Zero);
    }

    public static MountLaw Mount(double stiffness, double lossFactor, double damping = 0) =>
        new DiagonalMount([new SpringDamper(Direction.X, stiffness, lossFactor, damping)]);

    public static JointEnd End(string part, int mass) => new(part, mass.ToString(System.Globalization.CultureInfo.InvariantCulture));

    public static Joint Rigid(JointEnd first, JointEnd second) => Joint.Rigid("joint", first, second, Direction.X);

    public static Joint Through(MountLaw mount, JointEnd first, JointEnd second) => Joint.Through(mount, "joint", first, second);

    /// <summary>The same force at every line.</summary>
    public static ForceSet Force(ForceKind kind, FrequencyAxis axis, JointEnd at, Complex value) =>
        Force(kind, axis, at, Enumerable.Repeat(value, axis.Count).ToArray());

    public static ForceSet Force(ForceKind kind, FrequencyAxis axis, JointEnd at, Complex[] spectrum) =>
        new(kind, at.Part!, axis, [new Dof(at.Point, Direction.X)], [spectrum]);

    /// <summary>Displacement at a mass.</summary>
    public static Response At(JointEnd end, string name = "response") =>
        new(name, end.Part!, new Dof(end.Point, Direction.X), Quantity.Displacement);

    public static PredictionResult Predict(
        FrequencyAxis axis, PlacedPart[] parts, Joint[] joints, ForceSet[] forces, params Response[] responses)
    {
        var diagnostics = new DiagnosticBag();
        PredictionResult? result = Predict(axis, parts, joints, forces, responses, diagnostics);
        Assert.True(result is not null, string.Join("\n", diagnostics.Items.Select(item => item.Message)));
        return result;
    }

    public static PredictionResult? Predict(
        FrequencyAxis axis, PlacedPart[] parts, Joint[] joints, ForceSet[] forces, Response[] responses, DiagnosticBag diagnostics)
    {
        var operation = new Operation("operation", ForceSum.Phase, Amplitude.Rms, forces);
        return Predictor.Predict(new AssemblyModel("chain", axis, parts, joints, [operation], responses), diagnostics);
    }

    public static Complex[] Spectrum(this PredictionResult result, int response = 0) => [.. result.Operations[0].Responses[response].Values];

    public static Complex[] JointForce(this PredictionResult result, int row = 0) => [.. result.Operations[0].JointForces[row].Values];
}
