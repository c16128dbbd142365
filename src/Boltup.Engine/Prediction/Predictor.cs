using Boltup.Engine.Coupling;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Kernels;
using Boltup.Engine.Paths;
using Boltup.Engine.Sensitivity;
using Boltup.Engine.Spectra;
using Boltup.Engine.Targets;

namespace Boltup.Engine.Prediction;

/// <summary>Couples an assembly, applies its operations and collects the responses and joint forces.</summary>
public sealed class Predictor
{
    private readonly AssemblyModel _assembly;
    private readonly CouplingLayout _layout;
    private readonly int[] _responseRows;
    private readonly ForceCases _cases;

    private Predictor(AssemblyModel assembly)
    {
        _assembly = assembly;
        _layout = new CouplingLayout(assembly.Parts, assembly.Joints);
        _responseRows = [.. assembly.Responses.Select(response => _layout[response.Part].AddResponse(response.Dof))];
        _cases = new ForceCases(assembly, _layout);
    }

    /// <summary>Computes everything that the assembly asks for.</summary>
    /// <returns>The result, or null after an error in <paramref name="diagnostics"/>.</returns>
    public static PredictionResult? Predict(
        AssemblyModel assembly, DiagnosticBag diagnostics, CancellationToken cancellation = default) =>
        Predict(assembly, diagnostics, withPaths: false, cancellation);

    /// <summary>Computes everything that the assembly asks for.</summary>
    /// <param name="withPaths">Whether to take every response apart into the contributions of forces and joints as well.</param>
    /// <returns>The result, or null after an error in <paramref name="diagnostics"/>.</returns>
    public static PredictionResult? Predict(
        AssemblyModel assembly, DiagnosticBag diagnostics, bool withPaths, CancellationToken cancellation = default)
    {
        var predictor = new Predictor(assembly);
        if (predictor.ReadParts(new PartFrfs(), diagnostics) is not { } frfs)
        {
            return null;
        }

        PathAnalysis? paths = withPaths ? new PathAnalysis(assembly, predictor._layout, predictor._cases) : null;
        return predictor.Solve(frfs, diagnostics, paths, paths?.Transfers, cancellation)?.Result;
    }

    /// <summary>Computes the responses, and keeps what they were made from with transfers from the joints and adjoints.</summary>
    /// <param name="shared">FRFs that were read already, and that will be used again.</param>
    internal static (PredictionResult Result, PredictionRun Run)? Run(
        AssemblyModel assembly, PartFrfs shared, DiagnosticBag diagnostics, CancellationToken cancellation)
    {
        var predictor = new Predictor(assembly);
        var transfers = new PathTransfers(predictor._layout, assembly.Axis, assembly.Responses, forces: []);
        return predictor.ReadParts(shared, diagnostics) is { } frfs
            && predictor.Solve(frfs, diagnostics, paths: null, transfers, cancellation) is { Run: { } run, Result: var result }
            ? (result, run)
            : null;
    }

    /// <summary>Judges an assembly and the FRFs that it needs without coupling them.</summary>
    public static void Check(AssemblyModel assembly, DiagnosticBag diagnostics)
    {
        new Predictor(assembly).ReadParts(new PartFrfs(), diagnostics);
        MountRules.HintAtCausality(assembly, diagnostics);
    }

    private TiledMatrix?[]? ReadParts(PartFrfs known, DiagnosticBag diagnostics)
    {
        if (!AssemblyRules.Check(_assembly, _layout, diagnostics))
        {
            return null;
        }

        var frfs = new TiledMatrix?[_layout.Parts.Count];
        DiagnosticBag[] bags = [.. _layout.Parts.Select(_ => new DiagnosticBag())];
        Parallel.For(0, frfs.Length, i =>
        {
            if (_layout.Parts[i].IsUsed)
            {
                frfs[i] = known.Of(_layout.Parts[i], _assembly.Axis, bags[i]);
            }
        });
        foreach (DiagnosticBag bag in bags)
        {
            diagnostics.AddRange(bag.Items);
        }

        return Array.Exists(bags, bag => bag.HasErrors) ? null : frfs;
    }

    /// <param name="paths">What to work out of every response; null for nothing.</param>
    /// <param name="transfers">What to fill on the way: those of the paths, or by joints only.</param>
    private Prediction? Solve(
        TiledMatrix?[] frfs, DiagnosticBag diagnostics, PathAnalysis? paths, PathTransfers? transfers, CancellationToken cancellation)
    {
        CouplingSolution solution = new CouplingSolver(_layout, _assembly.Axis, frfs).Solve(_cases.Forces, _cases.Count, cancellation, transfers);
        if (!new ConditionCheck(_layout, _assembly.Axis, frfs).Check(solution.Condition, diagnostics))
        {
            return null;
        }

        PredictionRun? run = transfers is null ? null : new PredictionRun(_assembly, _layout, _cases, frfs, _responseRows, solution, transfers);
        OperationResult[] operations = ReadOperations(solution, paths, run);
        IReadOnlyList<TargetVerdict> verdicts = TargetCheck.Run(_assembly.Targets, operations, diagnostics);
        var result = new PredictionResult(
            _assembly.Title,
            _assembly.Axis,
            operations,
            new Conditioning(_layout.Constraints.Count == 0 ? [] : solution.Condition, _layout.RotationLength),
            KernelChoice.Name,
            [.. diagnostics.Items])
        {
            Mounts = MountSpectra.Of(_assembly),
            Verdicts = verdicts,
        };
        return new Prediction(result, run);
    }

    private OperationResult[] ReadOperations(CouplingSolution solution, PathAnalysis? paths, PredictionRun? run)
    {
        var reader = new OperationReader(_assembly, _layout, solution, _responseRows);
        SensitivityAnalysis? sensitivities = paths is null || run is null ? null : new SensitivityAnalysis(run);
        return [.. _assembly.Operations.Select((operation, i) =>
        {
            OperationResult result = reader.Read(operation, _cases[i]);
            return paths is null || sensitivities is null ? result : sensitivities.AddTo(paths.AddTo(result, i, solution), i);
        })];
    }

    /// <param name="Run">What the result was made from; null where nobody asked for transfers.</param>
    private sealed record Prediction(PredictionResult Result, PredictionRun? Run);
}
