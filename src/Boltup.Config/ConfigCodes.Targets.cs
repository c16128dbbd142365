using Boltup.Engine.Diagnostics;

namespace Boltup.Config;

/// <summary>Targets and weightings.</summary>
public static partial class ConfigCodes
{
    public static readonly DiagnosticCode WeightingDoesNotFit = new(
        "CFG101", "weighting of another quantity",
        "A and C weigh sound pressure as it is heard (IEC 61672-1); Wk, Wd and Wh weigh acceleration as it is felt (ISO 2631-1, ISO 5349-1).",
        "quiet: { response: seat rail, limit: 90 dB, weighting: A }",
        "Choose a weighting of the quantity of the response, or ask for that quantity with `as`.");
}
