using Boltup.Engine.Acoustics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Paths;

/// <summary>A band in which paths are ranked.</summary>
/// <param name="Octave">The third octave; null for all lines together.</param>
public sealed record PathBand(OctaveBand? Octave, LineWeights Weights)
{
    /// <summary>All lines with their whole power.</summary>
    public static PathBand Overall(int lines) => new(null, LineWeights.All(lines));

    /// <summary>The third octaves that lines of an axis reach into, upwards.</summary>
    public static IReadOnlyList<PathBand> ThirdOctaves(FrequencyAxis axis)
    {
        var sums = new BandSums(axis);
        return [.. sums.Bands.Select((band, i) => new PathBand(band, Of(sums.PartsOf(i)))).Where(band => band.Weights.Factors.Length > 0)];
    }

    private static LineWeights Of(IReadOnlyList<(int Line, double Share)> parts) =>
        new(parts.Count > 0 ? parts[0].Line : 0, [.. parts.Select(part => part.Share)]);
}
