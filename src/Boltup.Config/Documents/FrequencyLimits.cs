namespace Boltup.Config.Documents;

/// <summary>Bounds on what a document may ask for.</summary>
internal static class FrequencyLimits
{
    public const int MaximumLines = 10_000_000;
}
