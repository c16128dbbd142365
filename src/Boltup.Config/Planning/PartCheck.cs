using Boltup.Config.Documents;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Parts;
using Boltup.Engine.Spectra;
using Boltup.Engine.VirtualPoints;

namespace Boltup.Config.Planning;

/// <summary>Judges a part by itself: its document, its files, and the FRFs between dofs that both respond and are excited.</summary>
public static class PartCheck
{
    /// <summary>Says everything that can be said about a part file.</summary>
    public static void Run(string path, LoadOptions options, DiagnosticBag diagnostics)
    {
        if (ConfigLoader.LoadPart(path, options, diagnostics).Document is not { } document)
        {
            return;
        }

        using var library = new DataLibrary(options, diagnostics);
        if (LonePart.Plan(document, library, diagnostics) is { Model.Axis: { } axis } part)
        {
            Judge(part, axis, diagnostics);
            JudgeVirtualPoints(document, library, axis, diagnostics);
        }
    }

    private static void JudgeVirtualPoints(PartDocument document, DataLibrary library, FrequencyAxis axis, DiagnosticBag diagnostics)
    {
        // The part is planned already, and said what there is to say of its files.
        var said = new DiagnosticBag();
        if (document.Model is not FrfModelDocument frf || document.VirtualPoints.Count == 0
            || new FrfPlanner(library, said).Plan("part", document, frf) is not { } data)
        {
            return;
        }

        IReadOnlyList<VirtualPoint> points = new VirtualPointPlanner(document.VirtualPoints, document.Points, said).PointsOf(data) ?? [];
        foreach ((VirtualPoint point, VirtualPointDocument written) in points.Zip(document.VirtualPoints))
        {
            foreach (VirtualPointQuality quality in VirtualPointCheck.Measure(data, point, axis, diagnostics))
            {
                VirtualPointCheck.Report(quality, written.Name.Span, diagnostics);
                VirtualPointCheck.Judge(quality, written.Name.Span, diagnostics);
            }
        }
    }

    private static void Judge(PlacedPart part, FrequencyAxis axis, DiagnosticBag diagnostics)
    {
        Dof[] both = [.. part.Model.Responses.Intersect(part.Model.Excitations).OrderBy(dof => dof.ToString(), StringComparer.Ordinal)];
        bool isComplete = Array.TrueForAll(both, row => Array.TrueForAll(both, column => part.Model.HasFrf(row, column)));
        if (both.Length == 0 || !isComplete)
        {
            return;
        }

        DofCombination[] dofs = [.. both.Select(DofCombination.Own)];
        if (part.Evaluate(axis, dofs, dofs, diagnostics) is { } frf)
        {
            FrfQuality.Check(part.Name, part.Origin, axis, dofs, frf, diagnostics);
        }
    }
}
