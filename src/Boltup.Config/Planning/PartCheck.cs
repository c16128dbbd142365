using Boltup.Engine.Diagnostics;
using Boltup.Engine.Parts;
using Boltup.Engine.Spectra;

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
