namespace Boltup.Config.Yaml;

/// <summary>Bounds on what a document may be, far above any that people write and far below what would hurt.</summary>
internal static class YamlLimits
{
    public const int MaximumDepth = 24;
    public const int MaximumErrors = 50;
    public const int MaximumNodes = 200_000;
}
