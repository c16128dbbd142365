using Boltup.Engine.Coupling;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Kernels;
using Boltup.Engine.Parts;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Prediction;

/// <summary>Couples an assembly, applies its operations and collects the responses and joint forces.</summary>
public static class Predictor
{
    /// <summary>Computes everything that the assembly asks for.</summary>
    /// <returns>The result, or null after an error in <paramref name="diagnostics"/>.</returns>
    public static PredictionResult? Predict(
        AssemblyModel assembly, DiagnosticBag diagnostics, CancellationToken cancellation = default)
    {
        var layout = new CouplingLayout(assembly.Parts, assembly.Joints);
        int[] responseRows = [.. assembly.Responses.Select(response => layout[response.Part].AddResponse(response.Dof))];
        var cases = new ForceCases(assembly, layout);
        if (!AssemblyRules.Check(assembly, layout, diagnostics) || EvaluateParts(assembly, layout, diagnostics) is not { } frfs)
        {
            return null;
        }

        CouplingSolution solution = new CouplingSolver(layout, assembly.Axis, frfs).Solve(cases.Forces, cases.Count, cancellation);
        var condition = new ConditionCheck(layout, assembly.Axis, frfs);
        if (!condition.Check(solution.Condition, diagnostics))
        {
            return null;
        }

        IReadOnlyList<OperationResult> operations =
            [.. assembly.Operations.Select((operation, i) => new OperationReader(assembly, layout, solution, responseRows).Read(operation, cases[i]))];
        return new PredictionResult(
            assembly.Title,
            assembly.Axis,
            operations,
            new Conditioning(assembly.Joints.Count == 0 ? [] : solution.Condition, layout.RotationLength),
            KernelChoice.Name,
            [.. diagnostics.Items]);
    }

    private static TiledMatrix?[]? EvaluateParts(AssemblyModel assembly, CouplingLayout layout, DiagnosticBag diagnostics)
    {
        var frfs = new TiledMatrix?[layout.Parts.Count];
        DiagnosticBag[] bags = [.. layout.Parts.Select(_ => new DiagnosticBag())];
        Parallel.For(0, layout.Parts.Count, i =>
        {
            PartLayout part = layout.Parts[i];
            if (part.IsUsed)
            {
                frfs[i] = EvaluatePart(part, assembly.Axis, bags[i]);
            }
        });
        foreach (DiagnosticBag bag in bags)
        {
            diagnostics.AddRange(bag.Items);
        }

        return diagnostics.HasErrors ? null : frfs;
    }

    private static TiledMatrix? EvaluatePart(PartLayout part, FrequencyAxis axis, DiagnosticBag diagnostics)
    {
        TiledMatrix? frf = part.Part.Evaluate(axis, part.Rows, part.Columns, diagnostics);
        if (frf is not null)
        {
            FrfQuality.Check(part.Part.Name, part.Part.Origin, axis, part.Interface, frf, diagnostics);
        }

        return frf;
    }
}
