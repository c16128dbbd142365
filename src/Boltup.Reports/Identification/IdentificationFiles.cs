using Boltup.Engine.Prediction;

namespace Boltup.Reports.Identification;

/// <summary>Names of the files that an identification writes.</summary>
public static class IdentificationFiles
{
    public const string Handover = "source.forces.yaml";
    public const string Validation = "validation.csv";
    public const string ValidationBands = "validation_bands.csv";
    public const string Quality = "quality.csv";
    public const string Stiffness = "bench_stiffness.csv";
    public const string Summary = "summary.json";

    /// <summary>Blocked forces, or their auto and cross spectra.</summary>
    public static string Forces(string operation) => $"blocked_forces/{FileNames.FromName(operation)}.csv";

    /// <summary>The same as a Universal File.</summary>
    public static string UniversalForces(string operation) => $"blocked_forces/{FileNames.FromName(operation)}.uff";

    /// <summary>Standard deviation of their magnitudes over runs.</summary>
    public static string Scatter(string operation) => $"blocked_forces/{FileNames.FromName(operation)}-scatter.csv";

    /// <summary>Forces found another way.</summary>
    public static string Route(string route, string operation) => $"routes/{FileNames.FromName(route)}-{FileNames.FromName(operation)}.csv";
}
