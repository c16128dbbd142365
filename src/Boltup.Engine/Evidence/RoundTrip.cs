using Boltup.Engine.Diagnostics;
using Boltup.Engine.Kernels;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Evidence;

/// <summary>
/// FRFs at an interface that no sensor or hammer reaches, from paths over it: Y_cc = Y_ca Y_ba⁻¹ Y_bc, with a on the source, b on the
/// receiver and c the interface, all in one installation (round-trip identity, Moorhouse, Elliott, J. Acoust. Soc. Am. 134 (2013); from
/// memory). More dofs a and b than c are used through the pseudo-inverse of rank c, because nothing passes but over the interface.
/// </summary>
public static class RoundTrip
{
    /// <param name="fromSource">Y_ca.</param>
    /// <param name="through">Y_ba.</param>
    /// <param name="toReceiver">Y_bc; its columns are the interface dofs.</param>
    /// <returns>Y_cc, or null after an error in <paramref name="diagnostics"/>: too few dofs, or Y_ba of lower rank than c.</returns>
    public static FrfMatrix? Estimate(FrfMatrix fromSource, FrfMatrix through, FrfMatrix toReceiver, DiagnosticBag diagnostics)
    {
        FrfChain.RequireFit(toReceiver, fromSource, through);
        int wanted = toReceiver.Columns.Count;
        if (Math.Min(through.Rows.Count, through.Columns.Count) < wanted)
        {
            diagnostics.Error(
                EngineCodes.RoundTripTooShort,
                $"a round trip over {wanted} interface dofs needs as many dofs on either side, found {through.Columns.Count} on the source and {through.Rows.Count} on the receiver",
                help: "measure at more dofs, or estimate fewer interface dofs");
            return null;
        }

        // The kernel wants no fewer rows than columns; the transpose of the identity is the identity of the transposes.
        return through.Rows.Count >= through.Columns.Count
            ? Solve(fromSource, through, toReceiver, diagnostics)
            : Solve(FrfChain.Transpose(toReceiver), FrfChain.Transpose(through), FrfChain.Transpose(fromSource), diagnostics) is { } turned
                ? FrfChain.Transpose(turned)
                : null;
    }

    private static FrfMatrix? Solve(FrfMatrix fromSource, FrfMatrix through, FrfMatrix toReceiver, DiagnosticBag diagnostics)
    {
        (int rows, int columns, int wanted) = (through.Rows.Count, through.Columns.Count, toReceiver.Columns.Count);
        var svd = new BatchSvd(rows, columns);
        var projected = new TiledMatrix(Tiling.Lanes, columns, wanted);
        var inner = new TiledMatrix(through.Axis.Count, columns, wanted);
        var gains = new double[columns * Tiling.Lanes];
        List<double> singularHz = [];
        for (int tile = 0; tile < inner.TileCount; tile++)
        {
            svd.Factor(through.Values.Tile(tile), rows, columns);
            svd.Project(toReceiver.Values.Tile(tile), wanted, projected.Tile(0));
            LaneLines.Collect(InverseOfRank(svd.SingularValues, wanted, gains), through.Axis, tile, singularHz);
            svd.Combine(gains, projected.Tile(0), wanted, inner.Tile(tile));
        }

        if (singularHz.Count > 0)
        {
            SquareFrf.Refuse("the paths over the interface", singularHz, diagnostics);
            return null;
        }

        return FrfChain.Multiply(fromSource, inner, toReceiver.Columns);
    }

    /// <summary>1/σ for the largest values, as many as the rank, and 0 for the rest.</summary>
    /// <returns>One bit per lane with fewer values than that.</returns>
    private static byte InverseOfRank(ReadOnlySpan<double> values, int rank, double[] gains)
    {
        int count = values.Length / Tiling.Lanes;
        Span<double> ordered = stackalloc double[count];
        byte deficient = 0;
        for (int lane = 0; lane < Tiling.Lanes; lane++)
        {
            for (int i = 0; i < count; i++)
            {
                ordered[i] = values[i * Tiling.Lanes + lane];
            }

            ordered.Sort();
            double smallest = ordered[count - rank];
            deficient |= (byte)(Rank.IsFull(ordered[^1], smallest, count) ? 0 : 1 << lane);
            for (int i = lane; i < values.Length; i += Tiling.Lanes)
            {
                gains[i] = values[i] >= smallest ? 1 / values[i] : 0;
            }
        }

        return deficient;
    }
}
