using System.Numerics;

namespace Boltup.Engine.Spectra;

/// <summary>
/// FRFs between named dofs over a frequency axis, in the engine's one quantity: displacement (m, rad) or pressure (Pa)
/// per force (N, N·m) or volume velocity (m³/s), time factor e^{+jωt}. Rows are responses, columns are excitations.
/// </summary>
public sealed class FrfMatrix(FrequencyAxis axis, IReadOnlyList<Dof> rows, IReadOnlyList<Dof> columns)
{
    public FrequencyAxis Axis { get; } = axis;

    public IReadOnlyList<Dof> Rows { get; } = rows;

    public IReadOnlyList<Dof> Columns { get; } = columns;

    public TiledMatrix Values { get; } = new(axis.Count, rows.Count, columns.Count);

    public Complex this[int line, int row, int column] => Values[line, row, column];
}
