using System.Globalization;
using Boltup.Engine.Coupling;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Kernels;
using Boltup.Engine.Mounts;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Prediction;

/// <summary>Do the mounts dissipate, could their laws be real, and can their stiffness be inverted? Each law is judged once.</summary>
internal static class MountRules
{
    /// <summary>Ratio of the ends of a band from which a constant loss factor draws a note: one decade.</summary>
    private const double WideBand = 10;

    /// <summary>Rise of the stiffness over the band that is worth a note.</summary>
    private const double NotableRise = 0.1;

    /// <summary>Beyond this a two-port is a spring without mass, whose 2×2 stiffness is singular.</summary>
    private const double NoMassEffect = 1e12;

    public static void Check(AssemblyModel assembly, DiagnosticBag found)
    {
        foreach (Joint joint in JointsToJudge(assembly).Where(joint => AxisRules.IsWithinBand(joint.Mount!, assembly.Axis)))
        {
            CheckPassivity(joint, assembly.Axis, found);
            if (joint.Mount!.IsTwoPort)
            {
                CheckMassEffect(joint, assembly.Axis, found);
            }
        }
    }

    /// <summary>Notes a constant loss factor over a wide band: of interest to somebody who checks an assembly, not in every prediction.</summary>
    public static void HintAtCausality(AssemblyModel assembly, DiagnosticBag found)
    {
        (FrequencyAxis axis, Joint[] joints) = (assembly.Axis, JointsToJudge(assembly));
        double ratio = axis.LastHz / (axis.FirstHz > 0 ? axis.FirstHz : axis.Count > 1 ? axis[1] : axis.LastHz);
        double largest = joints.Select(joint => joint.Mount!.ConstantLossFactor).DefaultIfEmpty().Max();
        double rise = Math.Pow(ratio, 2 * largest / Math.PI) - 1;
        if (ratio < WideBand || rise < NotableRise)
        {
            return;
        }

        found.Note(
            EngineCodes.ConstantLossFactor,
            string.Create(
                CultureInfo.InvariantCulture,
                $"constant loss factors of mounts are used over {Math.Log10(ratio):F1} decades: a material with a loss factor of {largest:G3} would stiffen by about {100 * rise:F0} % on the way"),
            help: "describe the mount by `relaxation` or by a `table` where that matters",
            notes: $"concerned: {string.Join(", ", joints.Where(joint => joint.Mount!.ConstantLossFactor > 0).Select(NameOf))}");
    }

    /// <summary>One joint for every mount.</summary>
    private static Joint[] JointsToJudge(AssemblyModel assembly) =>
        [.. assembly.Joints.Where(joint => joint.Mount is { Order: > 0 }).DistinctBy(joint => joint.MountName ?? joint.Name)];

    private static void CheckPassivity(Joint joint, FrequencyAxis axis, DiagnosticBag found)
    {
        IReadOnlyList<double> offending = MountPassivity.Offending(joint.Mount!, axis);
        if (offending.Count == 0)
        {
            return;
        }

        double smallest = MountPassivity.SmallestLoss(joint.Mount!, axis, axis.IndexOf(offending[0]));
        found.Warning(
            EngineCodes.MountGivesPower,
            $"{NameOf(joint)} gives power instead of dissipating it at {FrequencyList.Of(offending)}",
            joint.Origin,
            "check the sign of the imaginary part, which is positive with e^{+jωt}, and for a table the noise of its measurement",
            string.Create(CultureInfo.InvariantCulture, $"smallest eigenvalue of the imaginary part at {offending[0]:G6} Hz: {smallest:G4} N/m"));
    }

    private static void CheckMassEffect(Joint joint, FrequencyAxis axis, DiagnosticBag found)
    {
        int order = joint.Mount!.Order;
        var stiffness = new TiledMatrix(Tiling.Lanes, order, order);
        var condition = new double[axis.TileCount * Tiling.Lanes];
        var lu = new BatchLu(order);
        for (int tile = 0; tile < axis.TileCount; tile++)
        {
            joint.Mount.FillStiffness(axis, tile, stiffness.Tile(0));
            lu.Factor(stiffness.Tile(0), order);
            lu.EstimateCondition(stiffness.Tile(0), condition.AsSpan(tile * Tiling.Lanes, Tiling.Lanes));
        }

        double[] massless = [.. Enumerable.Range(0, axis.Count).Where(line => !(condition[line] < NoMassEffect)).Select(line => axis[line])];
        if (massless.Length > 0)
        {
            found.Error(
                EngineCodes.NoMassEffect,
                $"{NameOf(joint)} has k11, k12, k21 and k22 of a spring without mass at {FrequencyList.Of(massless)}",
                joint.Origin,
                "give its stiffness as a table without the column `term`");
        }
    }

    private static string NameOf(Joint joint) => joint.MountName is null ? $"the mount of joint `{joint.Name}`" : $"mount `{joint.MountName}`";
}
