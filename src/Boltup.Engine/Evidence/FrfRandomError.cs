using Boltup.Engine.Spectra;

namespace Boltup.Engine.Evidence;

/// <summary>Random error of FRFs that were estimated by averaging, from coherence γ² and the number of averages n.</summary>
public static class FrfRandomError
{
    /// <summary>Relative standard deviation of |H|: √((1 − γ²)/(2nγ²)) (Bendat, Piersol, Random Data; ISO 7626-2).</summary>
    public static double Relative(double coherence, int averages) => Math.Sqrt((1 - coherence) / (2 * averages * coherence));

    /// <summary>
    /// Standard deviation of the real and of the imaginary part of every entry, |H|·√((1 − γ²)/(2(n − 1)γ²)), as real and imaginary parts.
    /// Infinite where the coherence is zero.
    /// </summary>
    /// <remarks>
    /// The published formula has n for the true coherence. An estimated one is drawn from the same n averages, of which the FRF has taken
    /// one degree of freedom; n − 1 makes the variance right on average for hits of like strength, which n would leave 1/n too small.
    /// </remarks>
    /// <param name="coherence">γ² as real parts, in [0, 1].</param>
    /// <param name="averages">At least 2: one average says nothing.</param>
    public static TiledMatrix StandardDeviation(TiledMatrix frf, TiledMatrix coherence, int averages)
    {
        ArgumentOutOfRangeException.ThrowIfLessThan(averages, 2);
        var deviation = new TiledMatrix(frf.Lines, frf.Rows, frf.Columns);
        for (int tile = 0; tile < frf.TileCount; tile++)
        {
            for (int at = 0; at < frf.TileLength; at += Tiling.EntryLength)
            {
                FillEntry(
                    frf.Tile(tile).Slice(at, Tiling.EntryLength),
                    coherence.Tile(tile).Slice(at, Tiling.Lanes),
                    averages - 1,
                    deviation.Tile(tile).Slice(at, Tiling.EntryLength));
            }
        }

        return deviation;
    }

    private static void FillEntry(ReadOnlySpan<double> frf, ReadOnlySpan<double> coherence, int freedom, Span<double> deviation)
    {
        for (int lane = 0; lane < Tiling.Lanes; lane++)
        {
            double power = frf[lane] * frf[lane] + frf[Tiling.Lanes + lane] * frf[Tiling.Lanes + lane];
            double known = Math.Clamp(coherence[lane], 0, 1);
            double sigma = known > 0 ? Math.Sqrt(power * (1 - known) / (2 * freedom * known)) : double.PositiveInfinity;
            (deviation[lane], deviation[Tiling.Lanes + lane]) = (sigma, sigma);
        }
    }
}
