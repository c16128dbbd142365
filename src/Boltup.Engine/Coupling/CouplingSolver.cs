using Boltup.Engine.Kernels;
using Boltup.Engine.Paths;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Coupling;

/// <summary>
/// Frequency-based substructuring with Lagrange multipliers (LM-FBS; de Klerk, Rixen, Voormeeren, AIAA J. 46 (2008) 1169) for rigid
/// and resilient joints: λ = (B Y Bᵀ + Z⁻¹)⁻¹ B Y f, then u = Y (f − Bᵀ λ). Only the rows and columns of the layout are computed.
/// </summary>
internal sealed class CouplingSolver
{
    private readonly CouplingLayout _layout;
    private readonly FrequencyAxis _axis;
    private readonly IReadOnlyList<TiledMatrix?> _frfs;
    private readonly int _order;

    /// <param name="frfs">FRFs of each part (rows × columns of its layout), null for a part that is not used.</param>
    public CouplingSolver(CouplingLayout layout, FrequencyAxis axis, IReadOnlyList<TiledMatrix?> frfs)
    {
        (_layout, _axis, _frfs) = (layout, axis, frfs);
        _order = layout.Constraints.Count;
    }

    /// <summary>Solves all lines, tiles in parallel; the result does not depend on the number of threads.</summary>
    /// <param name="forces">For each part the forces on its columns: columns × cases. Null for a part without forces.</param>
    /// <param name="cases">Number of columns of forces.</param>
    /// <param name="transfers">What to fill with the transfers of the paths on the way; null where nobody asks for them.</param>
    public CouplingSolution Solve(
        IReadOnlyList<TiledMatrix?> forces, int cases, CancellationToken cancellation, PathTransfers? transfers = null)
    {
        var solution = new CouplingSolution(
            new TiledMatrix(_axis.Count, _order, cases),
            [.. _layout.Parts.Select((part, i) => ResponsesOf(part, i, cases))],
            new double[_axis.Count]);
        Parallel.For(
            0,
            _axis.TileCount,
            new ParallelOptions { CancellationToken = cancellation },
            () => new Worker(this, forces, solution, cases, transfers),
            (tile, _, worker) =>
            {
                worker.Solve(tile);
                return worker;
            },
            _ => { });
        return solution;
    }

    private TiledMatrix? ResponsesOf(PartLayout part, int index, int cases) =>
        _frfs[index] is null || part.ResponseCount == 0 ? null : new TiledMatrix(_axis.Count, part.ResponseCount, cases);

    /// <summary>The workspace of one thread.</summary>
    private sealed class Worker
    {
        private readonly CouplingSolver _solver;
        private readonly IReadOnlyList<TiledMatrix?> _forces;
        private readonly CouplingSolution _solution;
        private readonly int _cases;
        private readonly InterfaceMatrix _interface;
        private readonly TiledMatrix _matrix;
        private readonly TiledMatrix _partMotion;
        private readonly TiledMatrix _partForces;
        private readonly BatchLu _lu;
        private readonly PathKernel? _paths;

        public Worker(
            CouplingSolver solver, IReadOnlyList<TiledMatrix?> forces, CouplingSolution solution, int cases, PathTransfers? transfers)
        {
            (_solver, _forces, _solution, _cases) = (solver, forces, solution, cases);
            _interface = new InterfaceMatrix(solver._layout, solver._axis, solver._frfs);
            _matrix = new TiledMatrix(Tiling.Lanes, solver._order, solver._order);
            _partMotion = new TiledMatrix(Tiling.Lanes, solver._layout.Parts.Max(part => part.InterfaceCount), cases);
            _partForces = new TiledMatrix(Tiling.Lanes, solver._layout.Parts.Max(part => part.Columns.Count), cases);
            _lu = new BatchLu(solver._order);
            _paths = transfers is null ? null : new PathKernel(solver._layout, solver._frfs, transfers);
        }

        public void Solve(int tile)
        {
            if (_solver._order > 0)
            {
                SolveJointForces(tile);
            }

            for (int part = 0; part < _solver._layout.Parts.Count; part++)
            {
                if (_solution.Responses[part] is { } responses)
                {
                    Respond(part, tile, responses);
                }
            }

            _paths?.Fill(tile, _lu);
        }

        private void SolveJointForces(int tile)
        {
            Span<double> lambda = _solution.JointForces.Tile(tile);
            for (int part = 0; part < _forces.Count; part++)
            {
                AddFreeMotion(part, tile, lambda);
            }

            _interface.Fill(tile, _matrix.Tile(0));
            _lu.Factor(_matrix.Tile(0), _solver._order);
            _lu.Solve(lambda, _cases);
            _solver._layout.Unscale(lambda, _cases);
            KeepCondition(tile);
        }

        /// <summary>Adds S B Y f of one part to the right-hand side.</summary>
        private void AddFreeMotion(int part, int tile, Span<double> rightHandSide)
        {
            PartLayout layout = _solver._layout.Parts[part];
            if (_forces[part] is not { } forces || _solver._frfs[part] is not { } frf || layout.InterfaceCount == 0)
            {
                return;
            }

            Span<double> motion = _partMotion.Tile(0)[..(layout.InterfaceCount * _cases * Tiling.EntryLength)];
            ReadOnlySpan<double> interfaceRows = frf.Tile(tile)[..(layout.InterfaceCount * frf.Columns * Tiling.EntryLength)];
            BatchProduct.Multiply(interfaceRows, forces.Tile(tile), motion, layout.InterfaceCount, frf.Columns, _cases);
            foreach (ConstraintEnd end in layout.Ends)
            {
                double factor = end.Sign * _solver._layout.ScaleOf(end.Constraint);
                for (int column = 0; column < _cases; column++)
                {
                    TileEntry.AddScaled(
                        rightHandSide, end.Constraint * _cases + column, motion, end.Interface * _cases + column, factor);
                }
            }
        }

        private void KeepCondition(int tile)
        {
            Span<double> lanes = stackalloc double[Tiling.Lanes];
            _lu.EstimateCondition(_matrix.Tile(0), lanes);
            int first = tile * Tiling.Lanes;
            lanes[..Math.Min(Tiling.Lanes, _solution.Condition.Length - first)].CopyTo(_solution.Condition.AsSpan(first));
        }

        /// <summary>u = Y (f − Bᵀ λ) for the responses of one part.</summary>
        private void Respond(int part, int tile, TiledMatrix responses)
        {
            PartLayout layout = _solver._layout.Parts[part];
            TiledMatrix frf = _solver._frfs[part]!;
            Span<double> total = _partForces.Tile(0)[..(frf.Columns * _cases * Tiling.EntryLength)];
            PartLoads.Fill(layout, frf.Columns, _forces[part], _solution.JointForces.Tile(tile), tile, _cases, total);
            ReadOnlySpan<double> responseRows = frf.Tile(tile)[(layout.InterfaceCount * frf.Columns * Tiling.EntryLength)..];
            BatchProduct.Multiply(responseRows, total, responses.Tile(tile), layout.ResponseCount, frf.Columns, _cases);
        }
    }
}
