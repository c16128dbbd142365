using System.Numerics;
using Boltup.Engine.Coupling;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Evidence;

/// <summary>
/// The matrix T that turns blocked forces into the contact forces that an installation would measure: f = T f̄ with
/// T = (Y_S + Y_R)⁻¹ Y_S (Mondot, Petersson, J. Sound Vib. 114 (1987) 507; from memory). Y_R is the receiver as the source's interface
/// feels it, mounts included. T is the unit matrix where the receiver is rigid against the source.
/// </summary>
/// <remarks>
/// All FRFs are receptances between the interface dofs, rows and columns in one order; the dof of source and bench at a place in the
/// order belong together. Each method gives n×n entries per line, or null after an error in the bag: a sum of FRFs is singular.
/// </remarks>
public static class ContactTransfer
{
    /// <summary>From source and bench, each hung or standing for itself.</summary>
    /// <param name="mounts">Mounts between them; a dof that is in none is joined rigidly. A direction that its mount does not carry must not be among the dofs, and no mount may be a two-port.</param>
    public static TiledMatrix? FromFreeParts(
        FrfMatrix source, FrfMatrix bench, IReadOnlyList<MountPath> mounts, DiagnosticBag diagnostics)
    {
        RequirePair(source, bench);
        TiledMatrix sum = WithMounts(source, bench, mounts);
        for (int tile = 0; tile < sum.TileCount; tile++)
        {
            Add(source.Values.Tile(tile), sum.Tile(tile));
        }

        return SquareFrf.Solve(source.Axis, sum, source.Values, "source and bench together", diagnostics);
    }

    /// <summary>From the installed source and the bench without it: T = Y_R⁻¹ Y_C.</summary>
    /// <param name="installed">FRFs at the source's interface in the installation.</param>
    /// <param name="mounts">As for <see cref="FromFreeParts"/>.</param>
    public static TiledMatrix? FromInstalledAndBench(
        FrfMatrix installed, FrfMatrix bench, IReadOnlyList<MountPath> mounts, DiagnosticBag diagnostics)
    {
        RequirePair(installed, bench);
        return SquareFrf.Solve(installed.Axis, WithMounts(installed, bench, mounts), installed.Values, "the bench", diagnostics);
    }

    /// <summary>From the installed source and the source hung free: T = 1 − Y_S⁻¹ Y_C, because Y_C⁻¹ = Y_S⁻¹ + Y_R⁻¹.</summary>
    /// <param name="installed">FRFs at the source's interface in the installation.</param>
    public static TiledMatrix? FromInstalledAndSource(FrfMatrix installed, FrfMatrix source, DiagnosticBag diagnostics)
    {
        RequirePair(installed, source);
        TiledMatrix? transfer = SquareFrf.Solve(source.Axis, source.Values, installed.Values, "the free source", diagnostics);
        for (int tile = 0; tile < (transfer?.TileCount ?? 0); tile++)
        {
            SubtractFromUnit(transfer!.Tile(tile), transfer.Rows);
        }

        return transfer;
    }

    /// <summary>T f̄: the contact forces that the installation would measure, named by the dofs of the blocked forces.</summary>
    public static SpectrumSet ContactForces(TiledMatrix transfer, SpectrumSet blocked)
    {
        int order = blocked.Dofs.Count;
        var contact = new Complex[order][];
        for (int row = 0; row < order; row++)
        {
            contact[row] = new Complex[blocked.Axis.Count];
            for (int column = 0; column < order; column++)
            {
                AddProduct(transfer.GatherSpectrum(row, column), blocked.Values[column], contact[row]);
            }
        }

        return blocked with { Values = contact };
    }

    private static void AddProduct(Complex[] factor, Complex[] values, Complex[] sum)
    {
        for (int line = 0; line < sum.Length; line++)
        {
            sum[line] += factor[line] * values[line];
        }
    }

    private static void RequirePair(FrfMatrix first, FrfMatrix second)
    {
        SquareFrf.RequireInterface(first, first.Columns);
        SquareFrf.RequireInterface(second, second.Columns);
        SquareFrf.RequireLines(first.Axis, second.Axis);
        if (first.Rows.Count != second.Rows.Count)
        {
            throw new ArgumentException($"{first.Rows.Count} dofs do not fit {second.Rows.Count}");
        }
    }

    /// <summary>The bench and the mounts in series with it, named by the dofs of the source.</summary>
    private static TiledMatrix WithMounts(FrfMatrix source, FrfMatrix bench, IReadOnlyList<MountPath> mounts)
    {
        int order = bench.Rows.Count;
        var series = new TiledMatrix(bench.Axis.Count, order, order);
        var compliance = new MountCompliance();
        int[][] places = [.. mounts.Select(path => PlacesOf(path, source.Rows, bench.Rows))];
        for (int tile = 0; tile < series.TileCount; tile++)
        {
            Span<double> sum = series.Tile(tile);
            bench.Values.Tile(tile).CopyTo(sum);
            for (int mount = 0; mount < mounts.Count; mount++)
            {
                AddBlock(compliance.Of(mounts[mount].Mount, bench.Axis, tile), places[mount], sum, order);
            }
        }

        return series;
    }

    private static void AddBlock(ReadOnlySpan<double> block, int[] places, Span<double> target, int order)
    {
        int size = places.Length;
        for (int i = 0; i < size * size; i++)
        {
            (int row, int column) = (places[i / size], places[i % size]);
            if (row >= 0 && column >= 0)
            {
                TileEntry.AddScaled(target, row * order + column, block, i, 1);
            }
        }
    }

    /// <summary>For each direction of the mount its place among the dofs, or −1 where it is not among them.</summary>
    private static int[] PlacesOf(MountPath path, IReadOnlyList<Dof> source, IReadOnlyList<Dof> bench)
    {
        if (path.Mount.IsTwoPort)
        {
            throw new ArgumentException($"the mount at {path.SourcePoint} has mass effect: its two ends carry different forces");
        }

        foreach (Dof dof in source.Where(dof => dof.Point == path.SourcePoint && !path.Mount.Directions.Contains(dof.Direction)))
        {
            throw new ArgumentException($"the mount at {path.SourcePoint} carries no force along {dof}");
        }

        return [.. path.Mount.Directions.Select(direction => Place(path, direction, source, bench))];
    }

    private static int Place(MountPath path, Direction direction, IReadOnlyList<Dof> source, IReadOnlyList<Dof> bench)
    {
        int place = source.ToList().IndexOf(new Dof(path.SourcePoint, direction));
        bool fits = place < 0 || bench[place] == new Dof(path.ReceiverPoint, direction);
        return fits ? place : throw new ArgumentException($"{source[place]} is joined to {bench[place]}, not to {path.ReceiverPoint}");
    }

    private static void Add(ReadOnlySpan<double> term, Span<double> sum)
    {
        for (int i = 0; i < sum.Length; i++)
        {
            sum[i] += term[i];
        }
    }

    private static void SubtractFromUnit(Span<double> tile, int order)
    {
        foreach (ref double value in tile)
        {
            value = -value;
        }

        for (int i = 0; i < order; i++)
        {
            foreach (ref double real in tile.Slice(i * (order + 1) * Tiling.EntryLength, Tiling.Lanes))
            {
                real += 1;
            }
        }
    }
}
