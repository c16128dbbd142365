using Boltup.Engine.Coupling;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Paths;

/// <summary>Lays the transfers of an assembly out before it is coupled, and takes its operations apart afterwards.</summary>
internal sealed class PathAnalysis
{
    private readonly AssemblyModel _assembly;
    private readonly ForceCases _cases;
    private readonly TiledMatrix _forces;

    public PathAnalysis(AssemblyModel assembly, CouplingLayout layout, ForceCases cases)
    {
        (_assembly, _cases) = (assembly, cases);
        ForceDof[] forces = [.. assembly.Operations
            .SelectMany(operation => operation.Forces)
            .SelectMany(set => set.Dofs.Select(dof => new ForceDof(set.Part, dof)))
            .Distinct()];
        Transfers = new PathTransfers(layout, assembly.Axis, assembly.Responses, forces);
        _forces = Gather(layout, cases, forces, assembly.Axis);
    }

    /// <summary>For the coupling to fill.</summary>
    public PathTransfers Transfers { get; }

    /// <summary>Adds the paths to the result of an operation.</summary>
    /// <param name="index">Place of the operation in the assembly.</param>
    public OperationResult AddTo(OperationResult result, int index, CouplingSolution solution)
    {
        var paths = new OperationPaths(Transfers, _forces, solution.JointForces, _cases[index], result.Axis, _assembly.Operations[index]);
        IReadOnlyList<PathBand> bands = PathBand.ThirdOctaves(result.Axis);
        PathView[] views = Transfers.Constraints.Count > 0 ? [PathView.Forces, PathView.Joints] : [PathView.Forces];
        var ranked = new ResponsePaths[_assembly.Responses.Count * views.Length];
        Parallel.For(0, ranked.Length, i =>
        {
            (int response, PathView view) = (i / views.Length, views[i % views.Length]);
            ranked[i] = ResponsePaths.Of(_assembly.Responses[response].Name, view, paths.Of(response, view), bands);
        });
        return result with { Paths = paths, RankedPaths = ranked };
    }

    /// <summary>The forces of all parts as one matrix, forces × cases.</summary>
    private static TiledMatrix Gather(CouplingLayout layout, ForceCases cases, ForceDof[] forces, FrequencyAxis axis)
    {
        var gathered = new TiledMatrix(axis.Count, forces.Length, cases.Count);
        for (int row = 0; row < forces.Length; row++)
        {
            TiledMatrix ofPart = cases.Forces[layout.Parts.TakeWhile(part => part.Part.Name != forces[row].Part).Count()]!;
            int column = layout[forces[row].Part].AddExcitation(forces[row].Own);
            for (int tile = 0; tile < gathered.TileCount; tile++)
            {
                int length = cases.Count * Tiling.EntryLength;
                ofPart.Tile(tile).Slice(column * length, length).CopyTo(gathered.Tile(tile)[(row * length)..]);
            }
        }

        return gathered;
    }
}
