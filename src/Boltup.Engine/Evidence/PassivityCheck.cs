using System.Globalization;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Kernels;
using Boltup.Engine.Parts;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Evidence;

/// <summary>
/// Passivity of FRFs: (Y + Yᴴ)/2 of the mobility has no negative eigenvalue (Newland; common practice). Stricter than the sign of each
/// driving point, because it also holds for forces at several dofs at once.
/// </summary>
public static class PassivityCheck
{
    /// <summary>Share of apparent power that noise may turn round.</summary>
    private const double TolerableShare = 0.05;

    /// <summary>Share of lines that may exceed it before it is worth a warning: noise does so near antiresonances.</summary>
    private const double TolerableLines = 0.05;

    /// <summary>Finds the eigenvalues of the dofs of motion that are both rows and columns.</summary>
    /// <param name="frf">Receptances.</param>
    public static Passivity Measure(FrfMatrix frf)
    {
        FrfPlace[] places = FrfPlace.InBoth(frf.Rows, frf.Columns);
        if (places.Length == 0)
        {
            return new Passivity(frf.Axis, 0, []);
        }

        int order = places.Length;
        var smallest = new double[frf.Axis.Count];
        var hermitian = new TiledMatrix(Tiling.Lanes, order, order);
        var shift = new double[Tiling.Lanes];
        var svd = new BatchSvd(order, order);
        for (int tile = 0; tile < frf.Values.TileCount; tile++)
        {
            FillScaled(frf.Values, tile, places, hermitian);
            ShiftToPositive(hermitian.Tile(0), order, shift);
            svd.Factor(hermitian.Tile(0), order, order);
            for (int line = tile * Tiling.Lanes; line < Math.Min(frf.Axis.Count, (tile + 1) * Tiling.Lanes); line++)
            {
                smallest[line] = Smallest(svd.SingularValues, line % Tiling.Lanes) - shift[line % Tiling.Lanes];
            }
        }

        return new Passivity(frf.Axis, order, smallest);
    }

    /// <summary>Warns when the structure seems to generate power at more lines than noise explains.</summary>
    /// <param name="owner">What the FRFs belong to, as messages begin.</param>
    public static void Judge(string owner, SourceSpan? origin, Passivity passivity, DiagnosticBag diagnostics)
    {
        double[] activeHz = [.. Enumerable.Range(0, passivity.SmallestEigenvalue.Count)
            .Where(line => !(passivity.SmallestEigenvalue[line] >= -TolerableShare))
            .Select(line => passivity.Axis[line])];
        if (activeHz.Length > TolerableLines * passivity.Axis.Count)
        {
            diagnostics.Warning(
                EngineCodes.NotPassive,
                string.Create(CultureInfo.InvariantCulture, $"{owner}: the FRFs between {passivity.Dofs} dofs generate power at {activeHz.Length} of {passivity.Axis.Count} lines"),
                origin,
                "look for a row or column with a wrong sign, scale or axis",
                $"at {FrequencyList.Of(activeHz)}",
                string.Create(CultureInfo.InvariantCulture, $"smallest eigenvalue of the mobility's Hermitian part: {passivity.SmallestEigenvalue.Min():P0} of apparent power"));
        }
    }

    /// <summary>D·j(Y − Yᴴ)/2·D, the Hermitian part of jωY over ω, with D = |Y_ii|^−½.</summary>
    private static void FillScaled(TiledMatrix frf, int tile, FrfPlace[] places, TiledMatrix target)
    {
        for (int i = 0; i < places.Length; i++)
        {
            for (int j = 0; j < places.Length; j++)
            {
                ReadOnlySpan<double> upper = frf.Entry(tile, places[i].Row, places[j].Column);
                ReadOnlySpan<double> lower = frf.Entry(tile, places[j].Row, places[i].Column);
                ReadOnlySpan<double> first = frf.Entry(tile, places[i].Row, places[i].Column);
                ReadOnlySpan<double> second = frf.Entry(tile, places[j].Row, places[j].Column);
                Span<double> entry = target.Entry(0, i, j);
                for (int lane = 0; lane < Tiling.Lanes; lane++)
                {
                    int imaginary = Tiling.Lanes + lane;
                    double scale = 0.5 / Math.Sqrt(Length(first, lane) * Length(second, lane));
                    entry[lane] = -scale * (upper[imaginary] + lower[imaginary]);
                    entry[imaginary] = scale * (upper[lane] - lower[lane]);
                }
            }
        }
    }

    /// <summary>
    /// Adds the Frobenius norm to the diagonal: all eigenvalues are then positive and equal to the singular values, which the batch kernel
    /// finds to a few units in the last place of the norm.
    /// </summary>
    private static void ShiftToPositive(Span<double> tile, int order, double[] shift)
    {
        for (int lane = 0; lane < Tiling.Lanes; lane++)
        {
            double squares = 0;
            for (int at = lane; at < tile.Length; at += Tiling.Lanes)
            {
                squares += tile[at] * tile[at];
            }

            shift[lane] = Math.Sqrt(squares);
            for (int i = 0; i < order; i++)
            {
                tile[i * (order + 1) * Tiling.EntryLength + lane] += shift[lane];
            }
        }
    }

    private static double Smallest(ReadOnlySpan<double> values, int lane)
    {
        double smallest = values[lane];
        for (int i = lane; i < values.Length; i += Tiling.Lanes)
        {
            smallest = Math.Min(smallest, values[i]);
        }

        return smallest;
    }

    private static double Length(ReadOnlySpan<double> entry, int lane) =>
        Math.Sqrt(entry[lane] * entry[lane] + entry[Tiling.Lanes + lane] * entry[Tiling.Lanes + lane]);
}
