namespace Boltup.Engine.Paths;

/// <summary>The paths of one response in one operation, ranked.</summary>
/// <param name="Overall">Over all lines.</param>
/// <param name="Bands">Per third octave, upwards.</param>
public sealed record ResponsePaths(string Response, PathView View, PathRanking Overall, IReadOnlyList<PathRanking> Bands)
{
    internal static ResponsePaths Of(string response, PathView view, PathSpectra spectra, IReadOnlyList<PathBand> bands) => new(
        response,
        view,
        PathRanking.Of(spectra, PathBand.Overall(spectra.Lines)),
        [.. bands.Select(band => PathRanking.Of(spectra, band))]);
}
