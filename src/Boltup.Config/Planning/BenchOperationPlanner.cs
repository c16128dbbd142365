using Boltup.Config.Documents;
using Boltup.Engine;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Identification;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;

namespace Boltup.Config.Planning;

/// <summary>Reads the operations of a bench.</summary>
internal sealed class BenchOperationPlanner(DataLibrary library, PointNames names, DiagnosticBag diagnostics)
{
    /// <summary>The operation over its own lines, or null after an error.</summary>
    public BenchOperation? Plan(BenchSpectraDocument document, IReadOnlyList<Dof> sensors)
    {
        if (document.IsCrossSpectra)
        {
            return PlanCrossSpectra(document, sensors);
        }

        var planner = new SpectraPlanner(library, names, diagnostics);
        SpectrumSet?[] runs = [.. document.Files.Select(file => planner.Read(file, sensors, document.Motion?.Value))];
        if (runs.Contains(null) || !ShareAxis(document, runs!))
        {
            return null;
        }

        IReadOnlyList<SpectrumSet>? columns = runs.Length == 1 ? (SpectrumSet[])runs! : Average(document, runs!);
        return columns is null
            ? null
            : new BenchOperation(
                document.Name.Value,
                AmplitudeOf(document, planner.Stated),
                runs.Length == 1 ? PhaseReference.Common : document.Phase,
                columns,
                runs.Length == 1 ? null : (SpectrumSet[])runs!)
            { Origin = document.Name.Span };
    }

    private BenchOperation? PlanCrossSpectra(BenchSpectraDocument document, IReadOnlyList<Dof> sensors)
    {
        int OrderOf(Dof dof, Quantity inFile) => !dof.IsMotion ? 0 : FrfQuantity.DerivativeOrder(
            inFile is Quantity.Displacement or Quantity.Velocity or Quantity.Acceleration ? inFile : document.Motion?.Value ?? Quantity.Acceleration);
        var planner = new CrossSpectraPlanner(library, names.Resolve, OrderOf, diagnostics);
        return planner.Read(document.Files[0], sensors) is { } columns
            ? new BenchOperation(document.Name.Value, AmplitudeOf(document, inFile: null), PhaseReference.Free, columns)
            {
                Origin = document.Name.Span,
                IsDensity = planner.IsDensity,
            }
            : null;
    }

    private IReadOnlyList<SpectrumSet>? Average(BenchSpectraDocument document, SpectrumSet[] runs)
    {
        if (document.Phase == PhaseReference.Free && runs.Length < 4)
        {
            diagnostics.Note(
                EngineCodes.FewRuns,
                $"operation `{document.Name}`: cross-spectra from {runs.Length} runs have rank {runs.Length} at most",
                document.Name.Span,
                "measure more runs if the source has more independent mechanisms");
        }

        return RunAverage.Of(runs, document.Phase, document.Name.Value, document.Name.Span, diagnostics);
    }

    private bool ShareAxis(BenchSpectraDocument document, SpectrumSet[] runs)
    {
        SpectrumSet? other = Array.Find(runs, run => !run.Axis.Matches(runs[0].Axis));
        if (other is not null)
        {
            diagnostics.Error(
                PlanCodes.MixedAxes,
                $"the runs of operation `{document.Name}` are on different lines",
                document.Name.Span,
                "process all runs with the same resolution",
                $"first run: {runs[0].Axis}",
                $"another: {other.Axis}");
        }

        return other is null;
    }

    private Amplitude AmplitudeOf(BenchSpectraDocument document, Amplitude? inFile)
    {
        Amplitude? stated = document.Amplitude?.Value ?? inFile;
        if (stated is null)
        {
            diagnostics.Note(
                EngineCodes.AmplitudeAssumed,
                $"operation `{document.Name}`: nothing says whether its spectra are rms or peak; taken as rms",
                document.Name.Span,
                "say `amplitude: rms` or `amplitude: peak`");
        }

        return stated ?? Amplitude.Rms;
    }
}
