using System.Diagnostics;
using System.Globalization;
using System.Numerics;
using Boltup.Benchmarks.Paths;
using Boltup.Engine.Comparing;
using Boltup.Engine.Coupling;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Geometry;
using Boltup.Engine.Mounts;
using Boltup.Engine.Parts;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;

namespace Boltup.Benchmarks.Comparing;

/// <summary>
/// A base against one changed mount: 24 directions of joints, 8,000 lines, 5 responses. Both assemblies hold the same parts; reading them is timed
/// by itself.
/// </summary>
internal static class CompareTimes
{
    private const int Joined = 8;
    private const int Lines = 8000;
    private const int Repetitions = 7;

    private static readonly FrequencyAxis Axis = FrequencyAxis.Even(20, 0.25, Lines);

    public static void Run(TextWriter output)
    {
        PlacedPart[] parts = [Placed("source", new SmoothPart(Joined, 0, Lines)), Placed("receiver", new SmoothPart(Joined, 2, Lines))];
        AssemblyModel before = Assembly(parts, 2e5), changed = Assembly(parts, 1.4e5);
        Say(output, "reading the parts once", Shortest(() => Predictor.Check(before, new DiagnosticBag())));
        Say(output, "prediction without paths", Shortest(() => Predictor.Predict(before, new DiagnosticBag())));
        Say(output, "prediction with paths and sensitivities", Shortest(() => Predictor.Predict(before, new DiagnosticBag(), withPaths: true)));
        Say(output, "comparison", Shortest(() => AssemblyComparer.Compare(before, changed, new DiagnosticBag())));
    }

    private static double Shortest(Action run) => Enumerable.Range(0, Repetitions).Min(_ =>
    {
        long start = Stopwatch.GetTimestamp();
        run();
        return Stopwatch.GetElapsedTime(start).TotalMilliseconds;
    });

    private static void Say(TextWriter output, string what, double milliseconds) =>
        output.WriteLine(string.Create(CultureInfo.InvariantCulture, $"{what,-45} {milliseconds,8:F0} ms"));

    /// <summary>All mounts alike but the first one.</summary>
    private static AssemblyModel Assembly(PlacedPart[] parts, double firstStiffness)
    {
        Joint[] joints = [.. Enumerable.Range(0, Joined).Select(i => Joint.Through(
            Mount(i == 0 ? firstStiffness : 2e5), SmoothPart.NameOf(i), new JointEnd("source", SmoothPart.NameOf(i)), new JointEnd("receiver", SmoothPart.NameOf(i)))
            with { MountName = i == 0 ? "first" : "others" })];
        Dof[] dofs = [.. Enumerable.Range(0, Joined).SelectMany(point => SmoothPart.Triad(SmoothPart.NameOf(point)))];
        var forces = new ForceSet(ForceKind.Blocked, "source", Axis, dofs, [.. dofs.Select((_, i) => Enumerable.Repeat(new Complex(1, i), Lines).ToArray())]);
        Response[] responses = [.. Enumerable.Range(Joined, 2)
            .SelectMany(point => SmoothPart.Triad(SmoothPart.NameOf(point)))
            .Take(5)
            .Select(dof => new Response(dof.ToString(), "receiver", dof, Quantity.Acceleration))];
        return new AssemblyModel("compare", Axis, parts, joints, [new Operation("run", ForceSum.Phase, Amplitude.Rms, [forces])], responses);
    }

    private static DiagonalMount Mount(double stiffness) =>
        new([.. SmoothPart.Triad("m").Select(dof => new SpringDamper(dof.Direction, stiffness, 0.12, 0))]);

    private static PlacedPart Placed(string name, SmoothPart model) => new(name, model, [], Rotation.None, Vector3d.Zero);
}
