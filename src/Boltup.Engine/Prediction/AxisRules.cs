using System.Globalization;
using Boltup.Engine.Coupling;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Mounts;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Prediction;

/// <summary>Do mounts and forces have data at the lines of the assembly?</summary>
internal static class AxisRules
{
    public static void Check(AssemblyModel assembly, DiagnosticBag found)
    {
        foreach (Joint joint in assembly.Joints)
        {
            CheckBand(joint, assembly.Axis, found);
        }

        foreach (Operation operation in assembly.Operations)
        {
            CheckOperation(operation, assembly.Axis, found);
        }
    }

    private static void CheckBand(Joint joint, FrequencyAxis axis, DiagnosticBag found)
    {
        if (joint.Mount?.Band is { } band && !IsWithinBand(joint.Mount, axis))
        {
            found.Error(
                EngineCodes.OutsideBand,
                string.Create(
                    CultureInfo.InvariantCulture,
                    $"joint `{joint.Name}`: the stiffness table of its mount covers {band.FromHz:G6} to {band.ToHz:G6} Hz only"),
                joint.Origin,
                "narrow `frequencies` to the band of the table, or extend the table; nothing is extrapolated",
                $"lines of the assembly: {axis}");
        }
    }

    /// <summary>Whether a mount is known at every line.</summary>
    internal static bool IsWithinBand(MountLaw mount, FrequencyAxis axis) => mount.Band is not { } band
        || (axis.FirstHz >= band.FromHz * (1 - FrequencyAxis.RelativeTolerance)
            && axis.LastHz <= band.ToHz * (1 + FrequencyAxis.RelativeTolerance));

    private static void CheckOperation(Operation operation, FrequencyAxis axis, DiagnosticBag found)
    {
        FrequencyAxis? shared = axis;
        foreach (ForceSet set in operation.Forces)
        {
            shared = shared?.SharedWith(set.Axis);
            SayUnused(operation, set, axis, found);
        }

        if (shared is null)
        {
            found.Error(
                EngineCodes.NoCommonAxis,
                $"operation `{operation.Name}`: its forces and the assembly have no common line",
                operation.Origin,
                "bring forces and FRFs to one grid; `frequencies` in the assembly interpolates the FRFs",
                [$"lines of the assembly: {axis}", .. operation.Forces.Select(set => $"lines of the forces of `{set.Part}`: {set.Axis}")]);
        }
    }

    private static void SayUnused(Operation operation, ForceSet set, FrequencyAxis axis, DiagnosticBag found)
    {
        double[] unused = [.. set.Axis.Hz.ToArray().Where(hz => axis.IndexOf(hz) < 0)];
        if (unused.Length > 0 && unused.Length < set.Axis.Count)
        {
            found.Warning(
                EngineCodes.ForceLinesUnused,
                $"operation `{operation.Name}`: {unused.Length} of {set.Axis.Count} force lines are not used, as the assembly has no FRFs at {FrequencyList.Of(unused)}",
                set.Origin,
                "give `frequencies` that include these lines, or accept the narrower band");
        }
    }
}
