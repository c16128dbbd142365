using Boltup.Engine.Diagnostics;
using Boltup.Engine.Geometry;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Parts;

/// <summary>A part at its place in an assembly: turned, then moved. Rotates FRFs into the axes of the assembly.</summary>
public sealed class PlacedPart(
    string name, IPartModel model, IReadOnlyList<PartPoint> points, Rotation turned, Vector3d moved, SourceSpan? origin = null)
{
    private readonly Dictionary<string, PartPoint> _points = points.ToDictionary(point => point.Name);

    public string Name { get; } = name;

    public IPartModel Model { get; } = model;

    public SourceSpan? Origin { get; } = origin;

    /// <summary>Position of a point in the assembly in m, or null when it is not known.</summary>
    public Vector3d? PositionOf(string point) =>
        _points.GetValueOrDefault(point)?.At is { } at ? moved + turned.Apply(at) : null;

    /// <summary>A direction of the assembly at a point, in the part's own dofs. Pressure and volume velocity have no direction.</summary>
    public DofCombination InAssemblyAxes(Dof dof)
    {
        if (!dof.IsMotion)
        {
            return DofCombination.Own(dof);
        }

        int axis = (int)dof.Direction % 3;
        Direction first = dof.IsRotation ? Direction.RX : Direction.X;
        var unit = new Vector3d(axis == 0 ? 1 : 0, axis == 1 ? 1 : 0, axis == 2 ? 1 : 0);
        Rotation own = _points.GetValueOrDefault(dof.Point)?.Axes ?? Rotation.None;
        Vector3d cosines = own.Resolve(turned.Resolve(unit));
        return new DofCombination(
            [.. Enumerable.Range(0, 3)
                .Where(i => cosines[i] != 0)
                .Select(i => new DofTerm(new Dof(dof.Point, first + i), cosines[i]))]);
    }

    /// <summary>FRFs between combinations of the part's dofs, rows × columns.</summary>
    /// <returns>The FRFs, or null after an error in <paramref name="diagnostics"/>.</returns>
    public TiledMatrix? Evaluate(
        FrequencyAxis axis, IReadOnlyList<DofCombination> rows, IReadOnlyList<DofCombination> columns, DiagnosticBag diagnostics)
    {
        Dof[] ownRows = OwnDofs(rows);
        Dof[] ownColumns = OwnDofs(columns);
        TiledMatrix? own = Model.Evaluate(axis, ownRows, ownColumns, diagnostics)?.Values;
        return own is null || (IsJust(ownRows, rows) && IsJust(ownColumns, columns))
            ? own
            : Combine(own, rows, ownRows, columns, ownColumns);
    }

    private static bool IsJust(Dof[] own, IReadOnlyList<DofCombination> combinations) =>
        own.Length == combinations.Count && combinations.All(combination => combination.IsOwnDof);

    private static Dof[] OwnDofs(IReadOnlyList<DofCombination> combinations) =>
        [.. combinations.SelectMany(combination => combination.Terms).Select(term => term.Dof).Distinct()];

    private static TiledMatrix Combine(
        TiledMatrix own, IReadOnlyList<DofCombination> rows, Dof[] ownRows, IReadOnlyList<DofCombination> columns, Dof[] ownColumns)
    {
        var combined = new TiledMatrix(own.Lines, rows.Count, columns.Count);
        for (int row = 0; row < rows.Count; row++)
        {
            for (int column = 0; column < columns.Count; column++)
            {
                foreach (DofTerm r in rows[row].Terms)
                {
                    foreach (DofTerm c in columns[column].Terms)
                    {
                        AddEntry(
                            own, Array.IndexOf(ownRows, r.Dof), Array.IndexOf(ownColumns, c.Dof), r.Cosine * c.Cosine, combined, row, column);
                    }
                }
            }
        }

        return combined;
    }

    private static void AddEntry(
        TiledMatrix source, int sourceRow, int sourceColumn, double factor, TiledMatrix target, int row, int column)
    {
        for (int tile = 0; tile < source.TileCount; tile++)
        {
            Span<double> from = source.Entry(tile, sourceRow, sourceColumn);
            Span<double> to = target.Entry(tile, row, column);
            for (int i = 0; i < to.Length; i++)
            {
                to[i] += factor * from[i];
            }
        }
    }
}
