using Boltup.Engine.Acoustics;
using Boltup.Engine.Paths;
using Boltup.Engine.Prediction;
using Boltup.Reports.Results;

namespace Boltup.Reports.Html;

/// <summary>What the paths of one response contribute over all lines, the strongest first.</summary>
/// <param name="Reference">What 0 dB is.</param>
public sealed record PagePaths(string Operation, string Response, PathView View, LevelReference Reference, IReadOnlyList<RankedPath> Ranked)
{
    internal static IEnumerable<PagePaths> Of(OperationResult operation) => operation.RankedPaths.Select(paths =>
    {
        ResponseSpectrum response = operation.Responses.First(response => response.Name == paths.Response);
        return new PagePaths(
            operation.Name, response.Name, paths.View, LevelReference.For(response.Quantity, response.Unit), paths.Overall.Paths);
    });
}
