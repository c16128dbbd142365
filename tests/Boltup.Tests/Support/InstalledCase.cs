using System.Numerics;
using Boltup.Config;
using Boltup.Config.Planning;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.MountIdentification;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;

namespace Boltup.Tests.Support;

/// <summary>
/// The reference case with constant mounts as somebody would measure it when installed: receptances between both ends of mounts, from
/// coupling the free parts.
/// </summary>
internal static class InstalledCase
{
    private static readonly Direction[] Translations = [Direction.X, Direction.Y, Direction.Z];

    /// <summary>Stiffness in N/m and loss factor of each mount, as in Data/case1/constant.assembly.yaml.</summary>
    public static readonly (double X, double Y, double Z)[] Stiffness =
    [
        (2.197708472416e+05, 1.449898446528e+05, 3.546165634815e+05),
        (2.184002230408e+05, 1.464801337713e+05, 3.429025535924e+05),
        (2.208274696911e+05, 1.535590570858e+05, 3.429812139192e+05),
        (2.060051396489e+05, 1.483137513879e+05, 3.387789069067e+05),
    ];

    public const double LossFactor = 1.226652450190e-01;

    /// <summary>Every tenth line of the case, measured at the given mounts, counted from 1.</summary>
    public static InstalledMounts Measure(params int[] mounts)
    {
        var diagnostics = new DiagnosticBag();
        using AssemblyPlan plan = AssemblyPlanner.Plan(Repository.PathTo("tests", "Boltup.Tests", "Data", "case1", "constant.assembly.yaml"), new LoadOptions(), diagnostics)!;
        (string Part, Dof Dof)[] dofs = [.. mounts.SelectMany(number => DofsAt("compressor", $"m{number}").Concat(DofsAt("body", $"b{number}")))];
        FrequencyAxis axis = FrequencyAxis.FromHertz([.. plan.Assembly.Axis.Hz.ToArray().Where((_, line) => line % 10 == 0)]);
        PredictionResult result = Predictor.Predict(
            plan.Assembly with
            {
                Axis = axis,
                Operations = [.. dofs.Select(dof => UnitForce(dof.Part, dof.Dof, axis))],
                Responses = [.. dofs.Select(dof => new Response(dof.Dof.ToString(), dof.Part, dof.Dof, Quantity.Displacement))],
            },
            diagnostics)!;
        var receptance = new TiledMatrix(axis.Count, dofs.Length, dofs.Length);
        for (int i = 0; i < dofs.Length * dofs.Length; i++)
        {
            receptance.ScatterSpectrum(i / dofs.Length, i % dofs.Length, [.. result.Operations[i % dofs.Length].Responses[i / dofs.Length].Values]);
        }

        return new InstalledMounts(axis, [.. dofs.Select(dof => dof.Dof)], receptance, [.. mounts.Select(number => new MountEnds($"m{number}", $"b{number}"))]);
    }

    private static IEnumerable<(string Part, Dof Dof)> DofsAt(string part, string point) =>
        Translations.Select(direction => (part, new Dof(point, direction)));

    private static Operation UnitForce(string part, Dof dof, FrequencyAxis axis) => new(
        dof.ToString(),
        ForceSum.Phase,
        Amplitude.Rms,
        [new ForceSet(ForceKind.Applied, part, axis, [dof], [[.. Enumerable.Repeat(Complex.One, axis.Count)]])]);
}
