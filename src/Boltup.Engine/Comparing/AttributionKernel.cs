using System.Runtime.Intrinsics;
using Boltup.Engine.Coupling;
using Boltup.Engine.Kernels;
using Boltup.Engine.Mounts;
using Boltup.Engine.Prediction;
using Boltup.Engine.Sensitivity;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Comparing;

/// <summary>
/// Sums Re(u* du) over the lines of a tile for every response and edit of the base, to first order:
/// du = αᵀ(Z' − Z)δ for mounts, du = wᵀ((Y' − Y)(f − Bᵀλ) + Y(f' − f)) with w = e + Bᵀa for parts and forces, e the row of the response.
/// Holds its own workspace: one per thread.
/// </summary>
internal sealed class AttributionKernel
{
    private readonly PredictionRun _base;
    private readonly PredictionRun _changed;
    private readonly AttributionPlan _plan;
    private readonly ResponseTiles _responses;
    private readonly MountKernel _mounts;
    private readonly TiledMatrix _otherStiffness = new(Tiling.Lanes, BothEnds.LargestOrder, BothEnds.LargestOrder);
    private readonly TiledMatrix _loads;
    private readonly TiledMatrix _difference;
    private readonly TiledMatrix _motion;
    private readonly LaneComplex[] _conjugates;
    private readonly LaneComplex[] _deformation = new LaneComplex[BothEnds.LargestOrder];
    private readonly LaneComplex[] _feeling = new LaneComplex[BothEnds.LargestOrder];
    private readonly int _cases;

    public AttributionKernel(PredictionRun before, PredictionRun changed, AttributionPlan plan, ResponseTiles responses)
    {
        (_base, _changed, _plan, _responses) = (before, changed, plan, responses);
        _cases = before.Cases.Count;
        _mounts = new MountKernel(before.Assembly.Axis);
        int rows = before.Layout.Parts.Max(part => part.InterfaceCount + part.ResponseCount);
        int columns = before.Layout.Parts.Max(part => part.Columns.Count);
        _loads = new TiledMatrix(Tiling.Lanes, columns, _cases);
        _difference = new TiledMatrix(Tiling.Lanes, rows, columns);
        _motion = new TiledMatrix(Tiling.Lanes, rows, _cases);
        _conjugates = new LaneComplex[before.Assembly.Responses.Count];
    }

    /// <summary>Writes the sums of one operation.</summary>
    /// <param name="cases">Its cases in the base.</param>
    /// <param name="shift">Place of its first case in the changed assembly, less that in the base.</param>
    /// <param name="sums">Receives responses × causes sums.</param>
    public void Fill(int tile, Range cases, int shift, Span<double> sums)
    {
        sums.Clear();
        Vector512<double> weights = _responses.Weights(tile);
        (int first, int count) = cases.GetOffsetAndLength(_cases);
        for (int column = first; column < first + count; column++)
        {
            for (int response = 0; response < _conjugates.Length; response++)
            {
                _conjugates[response] = weights * _responses.At(tile, response, column).Conjugate;
            }

            foreach (MountEdit edit in _plan.Mounts)
            {
                AddMount(edit, tile, column, sums);
            }

            foreach (PartEdit edit in _plan.Parts)
            {
                AddPart(edit, tile, column, sums);
                AddForces(edit, tile, column, shift, sums);
            }
        }
    }

    private void AddMount(MountEdit edit, int tile, int column, Span<double> sums)
    {
        int order = edit.Base.Order;
        Span<double> other = _otherStiffness.Tile(0)[..(order * order * Tiling.EntryLength)];
        edit.Changed.Mount!.FillStiffness(_base.Assembly.Axis, tile, other);
        _mounts.Load(edit.Base.Mount!, tile);
        _mounts.Deformation(_base.Solution.JointForces.Tile(tile), edit.First, _cases, column, _deformation);
        for (int response = 0; response < _conjugates.Length; response++)
        {
            _mounts.Feeling(_base.Transfers.Adjoint.Tile(tile), edit.First, _conjugates.Length, response, _feeling);
            LaneComplex sum = default;
            for (int entry = 0; entry < order * order; entry++)
            {
                LaneComplex change = LaneComplex.At(other, entry) - _mounts.Stiffness(entry / order, entry % order);
                sum += _feeling[entry / order] * (change * _deformation[entry % order]);
            }

            sums[response * _plan.Causes.Count + edit.Cause] += LaneComplex.RealOfProduct(_conjugates[response], sum);
        }
    }

    /// <summary>Other FRFs under the loads of the base.</summary>
    private void AddPart(PartEdit edit, int tile, int column, Span<double> sums)
    {
        if (edit.Cause < 0)
        {
            return;
        }

        TiledMatrix frf = _base.Frfs[edit.Base]!;
        Span<double> difference = _difference.Tile(0)[..(frf.Rows * frf.Columns * Tiling.EntryLength)];
        Subtract(frf.Tile(tile), _changed.Frfs[edit.Changed]!.Tile(tile), difference);
        PartLoads.Fill(
            _base.Layout.Parts[edit.Base], frf.Columns, _base.Cases.Forces[edit.Base], _base.Solution.JointForces.Tile(tile), tile, _cases, _loads.Tile(0));
        BatchProduct.Multiply(difference, _loads.Tile(0), _motion.Tile(0), frf.Rows, frf.Columns, _cases);
        AddMotion(edit.Base, tile, edit.Cause, column, _cases, sums);
    }

    /// <summary>Other forces on the FRFs of the base.</summary>
    private void AddForces(PartEdit edit, int tile, int column, int shift, Span<double> sums)
    {
        TiledMatrix? before = _base.Cases.Forces[edit.Base], after = _changed.Cases.Forces[edit.Changed];
        if (before is null && after is null)
        {
            return;
        }

        TiledMatrix frf = _base.Frfs[edit.Base]!;
        Span<double> loads = _loads.Tile(0)[..(frf.Columns * Tiling.EntryLength)];
        loads.Clear();
        for (int row = 0; row < frf.Columns; row++)
        {
            AddColumn(loads, row, after, tile, column + shift, 1);
            AddColumn(loads, row, before, tile, column, -1);
        }

        BatchProduct.Multiply(frf.Tile(tile), loads, _motion.Tile(0), frf.Rows, frf.Columns, 1);
        AddMotion(edit.Base, tile, edit.ForceCause, 0, 1, sums);
    }

    private static void AddColumn(Span<double> loads, int row, TiledMatrix? forces, int tile, int column, double factor)
    {
        if (forces is not null)
        {
            TileEntry.AddScaled(loads, row, forces.Tile(tile), row * forces.Columns + column, factor);
        }
    }

    private static void Subtract(ReadOnlySpan<double> before, ReadOnlySpan<double> after, Span<double> difference)
    {
        for (int i = 0; i < difference.Length; i++)
        {
            difference[i] = after[i] - before[i];
        }
    }

    /// <summary>wᵀ times what is in the workspace: rows × columns entries, of which one column counts.</summary>
    private void AddMotion(int part, int tile, int cause, int column, int columns, Span<double> sums)
    {
        ReadOnlySpan<double> motion = _motion.Tile(0);
        PartLayout layout = _base.Layout.Parts[part];
        for (int response = 0; response < _conjugates.Length; response++)
        {
            LaneComplex sum = default;
            foreach (ConstraintEnd end in layout.Ends)
            {
                LaneComplex felt = LaneComplex.At(_base.Transfers.Adjoint.Tile(tile), end.Constraint * _conjugates.Length + response);
                sum += end.Sign * (felt * LaneComplex.At(motion, end.Interface * columns + column));
            }

            if (_base.Assembly.Responses[response].Part == layout.Part.Name)
            {
                int row = layout.InterfaceCount + _base.ResponseRows[response];
                sum += _responses.InOwnUnit(tile, response, LaneComplex.At(motion, row * columns + column));
            }

            sums[response * _plan.Causes.Count + cause] += LaneComplex.RealOfProduct(_conjugates[response], sum);
        }
    }
}
