using Boltup.Engine.Diagnostics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Evidence;

/// <summary>
/// Looks for channels whose operational spectrum does not go with their installed FRFs: flipped, exchanged, in g, scaled or unrelated. Each
/// channel is compared with what the forces that the others identify predict for it (leave-one-out). A fault that is the same in FRFs and
/// operation harms nothing and is not seen; nor is the exchange of two channels that move alike.
/// </summary>
public static class ChannelOutliers
{
    /// <summary>Standard gravity in m/s² (ISO 80000-3).</summary>
    private const double Gravity = 9.80665;

    /// <summary>Relative tolerance of a named factor, for noise and calibration.</summary>
    private const double Tolerance = 0.12;

    /// <summary>Lines that are looked at; a constant factor needs no more.</summary>
    private const int MostLines = 48;

    /// <summary>Finds suspects; names them, never corrects.</summary>
    /// <param name="installed">FRFs of the channels from the interface dofs.</param>
    /// <param name="operation">Spectra of the same channels in the same order and quantity, at the same lines.</param>
    /// <returns>The findings, or null when there are no more channels than forces, so that any spectra agree.</returns>
    public static ChannelReport? Find(FrfMatrix installed, SpectrumSet operation)
    {
        SquareFrf.RequireInterface(installed, operation.Dofs);
        SquareFrf.RequireLines(installed.Axis, operation.Axis);
        if (installed.Rows.Count <= installed.Columns.Count)
        {
            return null;
        }

        int[] lines = Spread(installed.Axis.Count);
        double[] scales = [.. KindWeights.Of(operation.Dofs, operation.Values).Select(Math.Sqrt)];
        var fit = new ChannelFit(installed, operation, lines, scales);
        double misfit = fit.Misfit();
        var found = new ChannelSearch(fit, installed.Columns.Count).Find();
        fit.Apply(found.Select(entry => entry.Correction));
        return new ChannelReport(
            [.. found.OrderByDescending(entry => entry.Rise).Select(entry => Name(entry.Correction, entry.Rise, operation.Dofs))],
            Math.Sqrt(Math.Max(misfit, 0)),
            Math.Sqrt(Math.Max(fit.Misfit(), 0)),
            lines.Length);
    }

    /// <summary>Warns about every suspect.</summary>
    /// <param name="owner">What the spectra belong to, as messages begin.</param>
    public static void Judge(string owner, SourceSpan? origin, ChannelReport report, DiagnosticBag diagnostics)
    {
        foreach (ChannelSuspect suspect in report.Suspects)
        {
            diagnostics.Warning(
                EngineCodes.ChannelSuspect,
                $"{owner}: {suspect.Describe()}",
                origin,
                "check the channel in both measurements; leave it out of the `indicators` until it is clear",
                FormattableString.Invariant($"the misfit of all channels rises by {suspect.EvidenceDb:F1} dB without this correction"),
                FormattableString.Invariant($"relative misfit of the least squares: {report.Misfit:G2} as measured, {report.CorrectedMisfit:G2} with all suspects corrected"));
        }
    }

    private static int[] Spread(int count)
    {
        int chosen = Math.Min(count, MostLines);
        return [.. Enumerable.Range(0, chosen).Select(i => chosen == 1 ? 0 : (int)((long)i * (count - 1) / (chosen - 1)))];
    }

    private static ChannelSuspect Name(ChannelCorrection correction, double rise, IReadOnlyList<Dof> channels)
    {
        double factor = correction.IsSwap ? 1 : correction.IsLeftOut ? double.NaN : 1 / correction.Factor;
        ChannelFault fault = correction.IsSwap ? ChannelFault.Swapped : FaultOf(factor);
        return new ChannelSuspect(
            fault,
            channels[correction.Channel],
            correction.IsSwap ? channels[correction.Other] : null,
            factor,
            10 * Math.Log10(rise));
    }

    private static ChannelFault FaultOf(double factor) => factor switch
    {
        double.NaN => ChannelFault.Unrelated,
        < 0 when IsNear(-factor, 1) => ChannelFault.Flipped,
        _ when IsNear(Math.Abs(factor), Gravity) || IsNear(Math.Abs(factor), 1 / Gravity) => ChannelFault.InG,
        _ => ChannelFault.Scaled,
    };

    private static bool IsNear(double value, double target) => Math.Abs(value / target - 1) < Tolerance;
}
