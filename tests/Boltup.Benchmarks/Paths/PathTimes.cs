using System.Diagnostics;
using System.Globalization;
using System.Numerics;
using Boltup.Engine.Coupling;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Geometry;
using Boltup.Engine.Mounts;
using Boltup.Engine.Parts;
using Boltup.Engine.Paths;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;

namespace Boltup.Benchmarks.Paths;

/// <summary>What contributions add to a prediction: 24 blocked forces, 24 directions of joints, 12 responses, 8,000 lines.</summary>
internal static class PathTimes
{
    private const int Joined = 8;
    private const int Responding = 4;
    private const int Lines = 8000;
    private const int Repetitions = 5;

    private static readonly FrequencyAxis Axis = FrequencyAxis.Even(20, 0.25, Lines);

    public static void Run(TextWriter output)
    {
        AssemblyModel assembly = Assembly();
        PredictionResult? result = null;
        Say(output, "prediction without paths", Shortest(() => result = Predictor.Predict(assembly, new DiagnosticBag())));
        Say(output, "prediction with paths", Shortest(() => result = Predictor.Predict(assembly, new DiagnosticBag(), withPaths: true)));
        OperationPaths paths = result!.Operations[0].Paths!;
        IReadOnlyList<PathBand> bands = PathBand.ThirdOctaves(Axis);
        Say(output, "of it: products of 12 responses × 24 forces", Shortest(() => ForAll(response => paths.Of(response, PathView.Forces))));
        Say(output, "of it: products of 12 responses × 24 joints", Shortest(() => ForAll(response => paths.Of(response, PathView.Joints))));
        PathSpectra[] spectra = [.. Enumerable.Range(0, 3 * Responding).Select(response => paths.Of(response, PathView.Forces))];
        Say(output, "of it: ranking of 12 responses by force", Shortest(() => ForAll(response => ResponsePaths.Of("", PathView.Forces, spectra[response], bands))));
        output.WriteLine(string.Create(CultureInfo.InvariantCulture, $"peak memory {Process.GetCurrentProcess().PeakWorkingSet64 >> 20} MiB"));
    }

    private static void ForAll(Action<int> take) => Parallel.For(0, 3 * Responding, take);

    private static double Shortest(Action run) => Enumerable.Range(0, Repetitions).Min(_ =>
    {
        long start = Stopwatch.GetTimestamp();
        run();
        return Stopwatch.GetElapsedTime(start).TotalMilliseconds;
    });

    private static void Say(TextWriter output, string what, double milliseconds) =>
        output.WriteLine(string.Create(CultureInfo.InvariantCulture, $"{what,-45} {milliseconds,8:F0} ms"));

    private static AssemblyModel Assembly()
    {
        PlacedPart source = Placed("source", new SmoothPart(Joined, 0, Lines));
        PlacedPart receiver = Placed("receiver", new SmoothPart(Joined, Responding, Lines));
        var mount = new DiagonalMount([.. new[] { Direction.X, Direction.Y, Direction.Z }.Select(direction => new SpringDamper(direction, 2e5, 0.12, 0))]);
        Joint[] joints = [.. Enumerable.Range(0, Joined).Select(SmoothPart.NameOf)
            .Select(point => Joint.Through(mount, point, new JointEnd("source", point), new JointEnd("receiver", point)))];
        Dof[] dofs = [.. Enumerable.Range(0, Joined).SelectMany(point => SmoothPart.Triad(SmoothPart.NameOf(point)))];
        var forces = new ForceSet(ForceKind.Blocked, "source", Axis, dofs, [.. dofs.Select((_, i) => Enumerable.Repeat(new Complex(1, i), Lines).ToArray())]);
        Response[] responses = [.. Enumerable.Range(Joined, Responding)
            .SelectMany(point => SmoothPart.Triad(SmoothPart.NameOf(point)))
            .Select(dof => new Response(dof.ToString(), "receiver", dof, Quantity.Acceleration))];
        return new AssemblyModel("paths", Axis, [source, receiver], joints, [new Operation("run", ForceSum.Phase, Amplitude.Rms, [forces])], responses);
    }

    private static PlacedPart Placed(string name, SmoothPart model) => new(name, model, [], Rotation.None, Vector3d.Zero);
}
