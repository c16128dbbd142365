using Boltup.Engine.Coupling;
using Boltup.Engine.Kernels;
using Boltup.Engine.Prediction;
using Boltup.Engine.Sensitivity;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Paths;

/// <summary>
/// Fills <see cref="PathTransfers"/> tile by tile, with the interface problem that the coupling has just factored: for unit forces
/// Λ = (B Y Bᵀ + Z⁻¹)⁻¹ B Y, then H = Y − Y Bᵀ Λ, of which −Y Bᵀ is K and the entries of Y on the response's own part are D. Holds its own
/// workspace: one per thread.
/// </summary>
internal sealed class PathKernel
{
    private readonly CouplingLayout _layout;
    private readonly IReadOnlyList<TiledMatrix?> _frfs;
    private readonly PathTransfers _target;
    private readonly (int Part, int Row)[] _responses;
    private readonly (int Part, int Column)[] _forces;
    private readonly TiledMatrix _lambda;
    private readonly int _order;

    public PathKernel(CouplingLayout layout, IReadOnlyList<TiledMatrix?> frfs, PathTransfers target)
    {
        (_layout, _frfs, _target) = (layout, frfs, target);
        _order = layout.Constraints.Count;
        _responses = [.. target.Responses.Select(RowOf)];
        _forces = [.. target.Forces.Select(force => (IndexOf(force.Part), layout[force.Part].AddExcitation(force.Own)))];
        _lambda = new TiledMatrix(Tiling.Lanes, _order, _forces.Length);
    }

    /// <param name="factored">The interface problem of the tile, as <see cref="InterfaceMatrix"/> fills it.</param>
    public void Fill(int tile, BatchLu factored)
    {
        Span<double> fromForces = _target.FromForces.Tile(tile);
        if (_order > 0)
        {
            FillJoints(tile);
            if (_forces.Length > 0)
            {
                SolveUnitForces(tile, factored);
                BatchProduct.Multiply(
                    _target.FromJoints.Tile(tile), _lambda.Tile(0), fromForces, _responses.Length, _order, _forces.Length);
            }
        }

        AddDirect(tile, fromForces);
        for (int response = 0; response < _responses.Length; response++)
        {
            Differentiate(tile, response);
        }

        if (_order > 0)
        {
            AdjointKernel.Fill(_layout, _target, tile, factored);
        }
    }

    private (int Part, int Row) RowOf(Response response)
    {
        PartLayout part = _layout[response.Part];
        return (IndexOf(response.Part), part.InterfaceCount + part.AddResponse(response.Dof));
    }

    private int IndexOf(string part) => _layout.Parts.TakeWhile(candidate => candidate.Part.Name != part).Count();

    /// <summary>K as displacement or pressure.</summary>
    private void FillJoints(int tile)
    {
        Span<double> joints = _target.FromJoints.Tile(tile);
        for (int response = 0; response < _responses.Length; response++)
        {
            (int part, int row) = _responses[response];
            if (_frfs[part] is not { } frf)
            {
                continue;
            }

            foreach (ConstraintEnd end in _layout.Parts[part].Ends)
            {
                TileEntry.AddScaled(joints, response * _order + end.Constraint, frf.Tile(tile), row * frf.Columns + end.Interface, -end.Sign);
            }
        }
    }

    /// <summary>Λ: the joint forces under one unit force at a time.</summary>
    private void SolveUnitForces(int tile, BatchLu factored)
    {
        Span<double> lambda = _lambda.Tile(0);
        lambda.Clear();
        for (int force = 0; force < _forces.Length; force++)
        {
            (int part, int column) = _forces[force];
            if (_frfs[part] is not { } frf)
            {
                continue;
            }

            foreach (ConstraintEnd end in _layout.Parts[part].Ends)
            {
                double factor = end.Sign * _layout.ScaleOf(end.Constraint);
                TileEntry.AddScaled(lambda, end.Constraint * _forces.Length + force, frf.Tile(tile), end.Interface * frf.Columns + column, factor);
            }
        }

        factored.Solve(lambda, _forces.Length);
        _layout.Unscale(lambda, _forces.Length);
    }

    private void AddDirect(int tile, Span<double> fromForces)
    {
        if (_target.Direct is not { } direct)
        {
            return;
        }

        Span<double> alone = direct.Tile(tile);
        for (int entry = 0; entry < _responses.Length * _forces.Length; entry++)
        {
            (int part, int row) = _responses[entry / _forces.Length];
            (int forcePart, int column) = _forces[entry % _forces.Length];
            if (part == forcePart && _frfs[part] is { } frf)
            {
                TileEntry.AddScaled(alone, entry, frf.Tile(tile), row * frf.Columns + column, 1);
                TileEntry.AddScaled(fromForces, entry, frf.Tile(tile), row * frf.Columns + column, 1);
            }
        }
    }

    /// <summary>Turns displacement into what is asked for at one response.</summary>
    private void Differentiate(int tile, int response)
    {
        int order = FrfQuantity.DerivativeOrder(_target.Responses[response].As);
        if (order > 0)
        {
            Differentiate(tile, response, order, _target.FromForces);
            Differentiate(tile, response, order, _target.FromJoints);
            if (_target.Direct is { } direct)
            {
                Differentiate(tile, response, order, direct);
            }
        }
    }

    private void Differentiate(int tile, int row, int order, TiledMatrix matrix)
    {
        for (int column = 0; column < matrix.Columns; column++)
        {
            Span<double> entry = matrix.Entry(tile, row, column);
            for (int lane = 0; lane < Tiling.Lanes; lane++)
            {
                double omega = _target.Axis.Omega(Math.Min(tile * Tiling.Lanes + lane, _target.Axis.Count - 1));
                (double real, double imaginary) = (entry[lane], entry[Tiling.Lanes + lane]);
                (entry[lane], entry[Tiling.Lanes + lane]) = order == 1
                    ? (-omega * imaginary, omega * real)
                    : (-omega * omega * real, -omega * omega * imaginary);
            }
        }
    }
}
