using Boltup.Engine.Prediction;
using Boltup.Reports.Results;

namespace Boltup.Reports.Html;

/// <summary>The level of one response in one operation.</summary>
public sealed record PageLevel(string Operation, string Response, string Dof, OverallLevel Level)
{
    internal static IEnumerable<PageLevel> Of(OperationResult operation) => operation.Responses.Select(response => new PageLevel(
        operation.Name, response.Name, response.Dof, OverallLevel.Of(response, operation.Axis, operation.Amplitude)));
}
