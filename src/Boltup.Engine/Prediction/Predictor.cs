using Boltup.Engine.Coupling;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Kernels;
using Boltup.Engine.Parts;
using Boltup.Engine.Paths;
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
        return predictor.ReadParts(diagnostics) is { } frfs ? predictor.Solve(frfs, diagnostics, withPaths, cancellation) : null;
    }

    /// <summary>Judges an assembly and the FRFs that it needs without coupling them.</summary>
    public static void Check(AssemblyModel assembly, DiagnosticBag diagnostics)
    {
        new Predictor(assembly).ReadParts(diagnostics);
        MountRules.HintAtCausality(assembly, diagnostics);
    }

    private TiledMatrix?[]? ReadParts(DiagnosticBag diagnostics)
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
                frfs[i] = ReadPart(_layout.Parts[i], _assembly.Axis, bags[i]);
            }
        });
        foreach (DiagnosticBag bag in bags)
        {
            diagnostics.AddRange(bag.Items);
        }

        return Array.Exists(bags, bag => bag.HasErrors) ? null : frfs;
    }

    private static TiledMatrix? ReadPart(PartLayout part, FrequencyAxis axis, DiagnosticBag diagnostics)
    {
        TiledMatrix? frf = part.Part.Evaluate(axis, part.Rows, part.Columns, diagnostics);
        if (frf is not null)
        {
            FrfQuality.Check(part.Part.Name, part.Part.Origin, axis, part.Interface, frf, diagnostics);
        }

        return frf;
    }

    private PredictionResult? Solve(TiledMatrix?[] frfs, DiagnosticBag diagnostics, bool withPaths, CancellationToken cancellation)
    {
        PathAnalysis? paths = withPaths ? new PathAnalysis(_assembly, _layout, _cases) : null;
        CouplingSolution solution = new CouplingSolver(_layout, _assembly.Axis, frfs)
            .Solve(_cases.Forces, _cases.Count, cancellation, paths?.Transfers);
        if (!new ConditionCheck(_layout, _assembly.Axis, frfs).Check(solution.Condition, diagnostics))
        {
            return null;
        }

        var reader = new OperationReader(_assembly, _layout, solution, _responseRows);
        OperationResult[] operations = [.. _assembly.Operations.Select((_, i) => ReadOperation(i, reader, paths, solution))];
        IReadOnlyList<TargetVerdict> verdicts = TargetCheck.Run(_assembly.Targets, operations, diagnostics);
        return new PredictionResult(
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
    }

    private OperationResult ReadOperation(int index, OperationReader reader, PathAnalysis? paths, CouplingSolution solution)
    {
        OperationResult result = reader.Read(_assembly.Operations[index], _cases[index]);
        return paths is null ? result : paths.AddTo(result, index, solution);
    }
}
