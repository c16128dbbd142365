using Boltup.Config.Documents;
using Boltup.Engine;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Evidence;
using Boltup.Engine.Identification;
using Boltup.Engine.Parts;
using Boltup.Engine.Spectra;
using Boltup.Files;

namespace Boltup.Config.Planning;

/// <summary>Reads the coherence of the installed FRFs.</summary>
internal sealed class CoherencePlanner(BenchDocument document, DataLibrary library, PointNames names, DiagnosticBag diagnostics)
{
    /// <summary>Coherence and number of averages of sensors × interface dofs, or null when the bench gives none, or after an error.</summary>
    public BenchCoherence? Plan(BenchModel bench)
    {
        BenchFrfDocument[] files = [.. document.InstalledFrfs.Where(file => file.Coherence is not null)];
        if (files.Length < document.InstalledFrfs.Count || files.Length == 0)
        {
            return null;
        }

        var curves = new Dictionary<DofPair, IFrfCurve>();
        foreach (BenchFrfDocument file in files)
        {
            if (!Add(file, curves))
            {
                return null;
            }
        }

        DofPair[] missing = [.. bench.Sensors.SelectMany(row => bench.Interface.Select(column => new DofPair(row, column)))
            .Where(pair => !curves.ContainsKey(pair))];
        if (missing.Length > 0)
        {
            diagnostics.Error(
                PlanCodes.CoherenceMissing,
                $"{missing.Length} of the installed FRFs have no coherence",
                files[0].Coherence!.Span,
                "give the coherence of every FRF, or of none",
                $"such as {string.Join(", ", missing.Take(4).AsEnumerable())}");
            return null;
        }

        FrfMatrix? coherence = new MeasuredPart("coherence", [.. curves.Values], fillByReciprocity: false, bench.Axis)
            .Evaluate(bench.Axis, bench.Sensors, bench.Interface, diagnostics);
        int averages = files.Min(file => file.Averages!.Value);
        return coherence is not null && CoherenceCheck.Check("the installed FRFs", files[0].Coherence!.Span, coherence, averages, diagnostics) is { } report
            ? new BenchCoherence(coherence.Values, averages, report)
            : null;
    }

    private bool Add(BenchFrfDocument document, Dictionary<DofPair, IFrfCurve> curves)
    {
        if (library.Open(document.Coherence!) is not { } file)
        {
            return false;
        }

        foreach (Curve curve in file.Curves.Where(curve => curve is { Kind: FunctionKind.Coherence, Response: not null, Excitation: not null }))
        {
            if (names.Resolve(curve.Response!) is { } response && names.Resolve(curve.Excitation!) is { } excitation)
            {
                // A ratio passes through as it is: displacement per force needs no power of jω.
                curves[new DofPair(response, excitation)] = new DataCurve(file, curve, response, excitation, FrfQuantity.Receptance);
            }
        }

        return true;
    }
}
