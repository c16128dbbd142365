using System.Numerics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Mounts;

/// <summary>
/// Dynamic stiffness from a table per direction, linear in real and imaginary parts between its lines (common practice). Outside its
/// band the mount is unknown.
/// </summary>
public sealed class TabledMount : MountLaw
{
    private readonly StiffnessTable[] _tables;

    /// <param name="tables">At least one, at most one per direction; all-zero tables are left out.</param>
    public TabledMount(IEnumerable<StiffnessTable> tables)
    {
        _tables = [.. tables.Where(table => table.Stiffness.Any(k => k != Complex.Zero)).OrderBy(table => table.Direction)];
        Directions = [.. _tables.Select(table => table.Direction)];
    }

    public override IReadOnlyList<Direction> Directions { get; }

    public override bool IsDiagonal => true;

    public override (double FromHz, double ToHz)? Band =>
        _tables.Length == 0 ? null : (_tables.Max(table => table.Axis.FirstHz), _tables.Min(table => table.Axis.LastHz));

    public override void FillStiffness(FrequencyAxis axis, int tile, Span<double> stiffness)
    {
        stiffness.Clear();
        for (int i = 0; i < _tables.Length; i++)
        {
            Span<double> entry = stiffness.Slice(i * (_tables.Length + 1) * Tiling.EntryLength, Tiling.EntryLength);
            for (int lane = 0; lane < Tiling.Lanes; lane++)
            {
                Complex k = _tables[i].At(HertzOf(axis, tile, lane));
                entry[lane] = k.Real;
                entry[Tiling.Lanes + lane] = k.Imaginary;
            }
        }
    }
}
