using Boltup.Engine.Diagnostics;
using Boltup.Engine.Evidence;
using Boltup.Engine.Parts;
using Boltup.Engine.Spectra;
using Boltup.Engine.VirtualPoints;

namespace Boltup.Engine.Identification;

/// <summary>What the data of a bench say of themselves, beyond coherence.</summary>
/// <param name="Channels">Indicator channels that do not go with their FRFs; null when nothing can be said.</param>
/// <param name="Completeness">Whether the interface carries everything, where FRFs from inside the source exist; null otherwise.</param>
/// <param name="VirtualPoints">How rigid the neighbourhoods of virtual points are.</param>
/// <param name="RoundTrip">How the interface FRFs agree with those estimated by a round trip over the interface; null where they cannot be.</param>
public sealed record BenchQuality(
    ChannelReport? Channels, IReadOnlyList<VirtualPointQuality> VirtualPoints, FrfAgreement? Completeness, FrfAgreement? RoundTrip)
{
    /// <summary>Judges what there is, and warns.</summary>
    /// <param name="installed">FRFs of all sensors, indicators first, from the interface dofs.</param>
    public static BenchQuality Judge(BenchModel bench, FrfMatrix installed, DiagnosticBag diagnostics)
    {
        ChannelReport? channels = FindOutliers(bench, installed, diagnostics);
        VirtualPointQuality[] virtualPoints = [.. bench.VirtualPoints.SelectMany(point =>
            VirtualPointCheck.Measure(bench.Data!, point, bench.Axis, diagnostics))];
        foreach (VirtualPointQuality quality in virtualPoints)
        {
            VirtualPointCheck.Judge(quality, null, diagnostics);
        }

        bool isSquare = bench.Interface.All(row => bench.Interface.All(column => bench.Installed.HasFrf(row, column)));
        if (!isSquare || bench.Installed.Evaluate(bench.Axis, bench.Interface, bench.Interface, diagnostics) is not { } atInterface)
        {
            return new BenchQuality(channels, virtualPoints, null, null);
        }

        DofCombination[] dofs = [.. bench.Interface.Select(DofCombination.Own)];
        FrfQuality.Check("installed source", null, bench.Axis, dofs, atInterface.Values, diagnostics);
        PassivityCheck.Judge("installed source", null, PassivityCheck.Measure(atInterface), diagnostics);
        (FrfAgreement? completeness, FrfAgreement? roundTrip) = OverTheInterface(bench, installed, atInterface, diagnostics);
        return new BenchQuality(channels, virtualPoints, completeness, roundTrip);
    }

    private static ChannelReport? FindOutliers(BenchModel bench, FrfMatrix installed, DiagnosticBag diagnostics)
    {
        BenchOperation? coherent = bench.Operations.FirstOrDefault(operation => operation.Phase == PhaseReference.Common);
        if (coherent is null)
        {
            return null;
        }

        int count = bench.Indicators.Count;
        var indicators = new FrfMatrix(bench.Axis, bench.Indicators, bench.Interface);
        TiledMatrix rows = TileRows.Take(installed.Values, 0, count);
        for (int tile = 0; tile < rows.TileCount; tile++)
        {
            rows.Tile(tile).CopyTo(indicators.Values.Tile(tile));
        }

        var measured = new SpectrumSet(bench.Axis, bench.Indicators, [.. coherent.Columns[0].Values.Take(count)]);
        ChannelReport? report = ChannelOutliers.Find(indicators, measured);
        if (report is not null)
        {
            ChannelOutliers.Judge($"operation `{coherent.Name}`", coherent.Origin, report, diagnostics);
        }

        return report;
    }

    /// <summary>Needs excitations inside the source that reach both the interface and the sensors.</summary>
    private static (FrfAgreement? Completeness, FrfAgreement? RoundTrip) OverTheInterface(
        BenchModel bench, FrfMatrix installed, FrfMatrix atInterface, DiagnosticBag diagnostics)
    {
        Dof[] inside = [.. bench.Installed.Excitations.Except(bench.Interface)
            .Where(dof => bench.Interface.Concat(bench.Sensors).All(row => bench.Installed.HasFrf(row, dof)))
            .Order()];
        if (inside.Length == 0
            || bench.Installed.Evaluate(bench.Axis, bench.Interface, inside, diagnostics) is not { } fromSource
            || bench.Installed.Evaluate(bench.Axis, bench.Sensors, inside, diagnostics) is not { } through)
        {
            return (null, null);
        }

        FrfAgreement? completeness = InterfaceCompleteness.Check(atInterface, installed, fromSource, through, diagnostics)?.Agreement;
        bool isLong = Math.Min(inside.Length, bench.Sensors.Count) >= bench.Interface.Count;
        FrfMatrix? estimate = isLong ? Evidence.RoundTrip.Estimate(fromSource, through, installed, diagnostics) : null;
        return (completeness, estimate is null ? null : FrfAgreement.Of(estimate, atInterface));
    }
}
