using System.Numerics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Mounts;

/// <summary>
/// A mount with mass effect: driving-point and transfer stiffness of ISO 10846 from tables, linear in real and imaginary parts between
/// their lines. Outside its band the mount is unknown.
/// </summary>
public sealed class TwoPortMount : MountLaw
{
    private readonly TwoPortTable[] _tables;

    /// <param name="tables">At least one, at most one per direction.</param>
    public TwoPortMount(IEnumerable<TwoPortTable> tables)
    {
        _tables = [.. tables.OrderBy(table => table.Direction)];
        Directions = [.. _tables.Select(table => table.Direction)];
    }

    public override IReadOnlyList<Direction> Directions { get; }

    public override bool IsDiagonal => false;

    public override bool IsTwoPort => true;

    public override (double FromHz, double ToHz)? Band
    {
        get
        {
            StiffnessTable[] terms = [.. _tables.SelectMany(table => table.Terms)];
            return (terms.Max(term => term.Axis.FirstHz), terms.Min(term => term.Axis.LastHz));
        }
    }

    public override void FillStiffness(FrequencyAxis axis, int tile, Span<double> stiffness)
    {
        stiffness.Clear();
        int count = _tables.Length;
        for (int i = 0; i < count; i++)
        {
            Put(_tables[i].K11, 1, axis, tile, EntryOf(stiffness, i, i));
            Put(_tables[i].K12, -1, axis, tile, EntryOf(stiffness, i, count + i));
            Put(_tables[i].K21, -1, axis, tile, EntryOf(stiffness, count + i, i));
            Put(_tables[i].K22, 1, axis, tile, EntryOf(stiffness, count + i, count + i));
        }
    }

    private Span<double> EntryOf(Span<double> stiffness, int row, int column) =>
        stiffness.Slice((row * Order + column) * Tiling.EntryLength, Tiling.EntryLength);

    private static void Put(StiffnessTable term, int sign, FrequencyAxis axis, int tile, Span<double> entry)
    {
        for (int lane = 0; lane < Tiling.Lanes; lane++)
        {
            Complex k = sign * term.At(HertzOf(axis, tile, lane));
            entry[lane] = k.Real;
            entry[Tiling.Lanes + lane] = k.Imaginary;
        }
    }
}
