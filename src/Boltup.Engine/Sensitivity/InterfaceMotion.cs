using Boltup.Engine.Coupling;
using Boltup.Engine.Kernels;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Sensitivity;

/// <summary>
/// What the joined dofs of the parts do in the coupled assembly: rows of Y (f − Bᵀλ). Holds its own workspace: one per thread.
/// </summary>
internal sealed class InterfaceMotion(PredictionRun run)
{
    private readonly int _cases = run.Cases.Count;
    private readonly TiledMatrix _loads = new(Tiling.Lanes, run.Layout.Parts.Max(part => part.Columns.Count), run.Cases.Count);
    private readonly TiledMatrix _motion = new(Tiling.Lanes, run.Layout.Parts.Max(part => part.InterfaceCount), run.Cases.Count);

    /// <summary>Displacements (m, rad) of one part, interface × cases entries; valid until the next call.</summary>
    public ReadOnlySpan<double> Of(int part, int tile)
    {
        PartLayout layout = run.Layout.Parts[part];
        TiledMatrix frf = run.Frfs[part]!;
        PartLoads.Fill(layout, frf.Columns, run.Cases.Forces[part], run.Solution.JointForces.Tile(tile), tile, _cases, _loads.Tile(0));
        Span<double> motion = _motion.Tile(0)[..(layout.InterfaceCount * _cases * Tiling.EntryLength)];
        BatchProduct.Multiply(
            frf.Tile(tile)[..(layout.InterfaceCount * frf.Columns * Tiling.EntryLength)],
            _loads.Tile(0), motion, layout.InterfaceCount, frf.Columns, _cases);
        return motion;
    }
}
