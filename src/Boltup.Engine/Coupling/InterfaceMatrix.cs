using Boltup.Engine.Spectra;

namespace Boltup.Engine.Coupling;

/// <summary>
/// Fills the matrix of the interface problem, tile by tile: S(B Y Bᵀ + Z⁻¹)S, with S = 1 for translations and a length for rotations.
/// Holds its own workspace: one per thread.
/// </summary>
internal sealed class InterfaceMatrix
{
    private readonly CouplingLayout _layout;
    private readonly FrequencyAxis _axis;
    private readonly IReadOnlyList<TiledMatrix?> _frfs;
    private readonly MountCompliance _compliance = new();
    private readonly int _order;

    /// <param name="frfs">FRFs of each part in the order of the layout, null for a part that is not used.</param>
    public InterfaceMatrix(CouplingLayout layout, FrequencyAxis axis, IReadOnlyList<TiledMatrix?> frfs)
    {
        (_layout, _axis, _frfs) = (layout, axis, frfs);
        _order = layout.Constraints.Count;
    }

    /// <summary>Writes the matrix at the lines of a tile.</summary>
    /// <param name="target">n×n entries, n the number of constraints.</param>
    public void Fill(int tile, Span<double> target)
    {
        target.Clear();
        for (int part = 0; part < _frfs.Count; part++)
        {
            if (_frfs[part] is { } frf)
            {
                AddPart(_layout.Parts[part].Ends, frf, tile, target);
            }
        }

        int first = 0;
        foreach (Joint joint in _layout.Joints)
        {
            if (joint.Mount is not null)
            {
                AddCompliance(joint, first, tile, target);
            }

            first += joint.Order;
        }
    }

    private void AddPart(IReadOnlyList<ConstraintEnd> ends, TiledMatrix frf, int tile, Span<double> target)
    {
        foreach (ConstraintEnd row in ends)
        {
            foreach (ConstraintEnd column in ends)
            {
                double factor = row.Sign * column.Sign * _layout.ScaleOf(row.Constraint) * _layout.ScaleOf(column.Constraint);
                TileEntry.AddScaled(
                    target, row.Constraint * _order + column.Constraint, frf.Tile(tile), row.Interface * frf.Columns + column.Interface, factor);
            }
        }
    }

    private void AddCompliance(Joint joint, int first, int tile, Span<double> target)
    {
        int size = joint.Order;
        ReadOnlySpan<double> compliance = _compliance.Of(joint.Mount!, _axis, tile);
        for (int i = 0; i < size * size; i++)
        {
            (int row, int column) = (first + i / size, first + i % size);
            TileEntry.AddScaled(target, row * _order + column, compliance, i, _layout.ScaleOf(row) * _layout.ScaleOf(column));
        }
    }
}
