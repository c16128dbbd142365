using Boltup.Benchmarks.Kernels;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Parts;
using Boltup.Engine.Spectra;

namespace Boltup.Benchmarks.Paths;

/// <summary>A part of invented smooth FRFs, held in memory: points with three directions, all of them excited but the last ones.</summary>
internal sealed class SmoothPart : IPartModel
{
    private readonly Dof[] _dofs;
    private readonly TiledMatrix _frf;

    /// <param name="joined">Points that can be excited.</param>
    /// <param name="responding">Points that respond only.</param>
    public SmoothPart(int joined, int responding, int lines)
    {
        _dofs = [.. Enumerable.Range(0, joined + responding).SelectMany(point => Triad(NameOf(point)))];
        Responses = _dofs;
        Excitations = _dofs[..(3 * joined)];
        _frf = FrfTiles.ModalSum(_dofs.Length, 3 * joined, lines);
    }

    public FrequencyAxis? Axis => null;

    public IReadOnlyCollection<Dof> Responses { get; }

    public IReadOnlyCollection<Dof> Excitations { get; }

    public static string NameOf(int point) => FormattableString.Invariant($"p{point}");

    /// <summary>The directions x, y, z of a point.</summary>
    public static Dof[] Triad(string point) => [new(point, Direction.X), new(point, Direction.Y), new(point, Direction.Z)];

    public bool HasFrf(Dof response, Dof excitation) => true;

    public FrfMatrix Evaluate(FrequencyAxis axis, IReadOnlyList<Dof> rows, IReadOnlyList<Dof> columns, DiagnosticBag diagnostics)
    {
        var picked = new FrfMatrix(axis, rows, columns);
        int[] fromRows = [.. rows.Select(dof => Array.IndexOf(_dofs, dof))];
        int[] fromColumns = [.. columns.Select(dof => Array.IndexOf(_dofs, dof))];
        for (int tile = 0; tile < _frf.TileCount; tile++)
        {
            for (int i = 0; i < rows.Count * columns.Count; i++)
            {
                (int row, int column) = (i / columns.Count, i % columns.Count);
                _frf.Entry(tile, fromRows[row], fromColumns[column]).CopyTo(picked.Values.Entry(tile, row, column));
            }
        }

        return picked;
    }
}
