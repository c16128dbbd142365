using Boltup.Config.Planning;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Parts;
using Boltup.Engine.Prediction;

namespace Boltup.Config.Comparing;

/// <summary>Two assemblies ready to be compared. Holds their data files open until it is disposed.</summary>
public sealed class ComparisonPlan : IDisposable
{
    private ComparisonPlan(AssemblyPlan before, AssemblyPlan changed)
    {
        (Base, Changed) = (before, changed);
        Differences = AssemblyDifferences.Of(before.Document, changed.Document);
        ChangedAssembly = changed.Assembly with { Parts = [.. changed.Assembly.Parts.Select(Shared)] };
    }

    public AssemblyPlan Base { get; }

    public AssemblyPlan Changed { get; }

    public AssemblyDifferences Differences { get; }

    /// <summary>The changed assembly, which holds the parts that did not change as the same objects as the base.</summary>
    public AssemblyModel ChangedAssembly { get; }

    /// <summary>Loads and plans both.</summary>
    /// <returns>The plan, or null after errors in <paramref name="diagnostics"/>.</returns>
    public static ComparisonPlan? Plan(string basePath, string changedPath, LoadOptions options, DiagnosticBag diagnostics)
    {
        // Each has its own errors: those of one must not hide those of the other.
        var found = new DiagnosticBag();
        AssemblyPlan? before = AssemblyPlanner.Plan(basePath, options, diagnostics);
        AssemblyPlan? changed = AssemblyPlanner.Plan(changedPath, options, found);
        diagnostics.AddUnsaid(found.Items);
        if (before is not null && changed is not null)
        {
            return new ComparisonPlan(before, changed);
        }

        before?.Dispose();
        changed?.Dispose();
        return null;
    }

    public void Dispose()
    {
        Base.Dispose();
        Changed.Dispose();
    }

    private PlacedPart Shared(PlacedPart part) => Differences.LeavePart(part.Name)
        ? Base.Assembly.Parts.First(candidate => candidate.Name == part.Name)
        : part;
}
