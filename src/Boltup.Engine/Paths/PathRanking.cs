namespace Boltup.Engine.Paths;

/// <summary>The paths of one response in one band, the strongest first.</summary>
/// <param name="Power">Mean square of the response in the band.</param>
/// <param name="Paths">By the power of their contributions; equal ones in the order of the assembly.</param>
/// <param name="Cancelling">The pairs that cancel most, at most <see cref="MostPairs"/>.</param>
public sealed record PathRanking(PathBand Band, double Power, IReadOnlyList<RankedPath> Paths, IReadOnlyList<PathPair> Cancelling)
{
    /// <summary>Pairs beyond these are no news.</summary>
    public const int MostPairs = 5;

    /// <summary>Smallest share of the summed powers that is called cancelling.</summary>
    private const double LeastCancelled = 0.01;

    private const double Halved = 0.5;

    public static PathRanking Of(PathSpectra spectra, PathBand band)
    {
        double power = spectra.TotalPower(band.Weights);
        RankedPath[] ranked = [.. spectra.Paths
            .Select((path, i) => Rank(path, power, spectra.PowerOf(i, band.Weights), spectra.PartOf(i, band.Weights)))
            .OrderByDescending(path => path.Power)];
        return new PathRanking(band, power, ranked, Pairs(spectra, band.Weights, ranked.Sum(path => path.Power)));
    }

    /// <summary>Power of a response when one contribution is multiplied by a factor: |u − (1 − s)c|².</summary>
    /// <param name="total">Σ|u|².</param>
    /// <param name="own">Σ|c|².</param>
    /// <param name="part">Σ Re(c u*).</param>
    internal static double PowerWith(double factor, double total, double own, double part) =>
        Math.Max(0, total - 2 * (1 - factor) * part + (1 - factor) * (1 - factor) * own);

    private static RankedPath Rank(TransferPath path, double total, double own, double part) =>
        new(path, own, part / total, 10 * Math.Log10(PowerWith(Halved, total, own, part) / total));

    private static PathPair[] Pairs(PathSpectra spectra, LineWeights weights, double powerSum)
    {
        var pairs = new List<PathPair>();
        for (int i = 0; i < spectra.Paths.Count; i++)
        {
            for (int j = i + 1; j < spectra.Paths.Count; j++)
            {
                double cancelled = -2 * spectra.Product(i, j, weights) / powerSum;
                if (cancelled >= LeastCancelled)
                {
                    pairs.Add(new PathPair(spectra.Paths[i], spectra.Paths[j], cancelled));
                }
            }
        }

        return [.. pairs.OrderByDescending(pair => pair.Cancelled).Take(MostPairs)];
    }
}
