namespace Boltup.Files.UniversalFile;

/// <summary>Response or reference of line 6 of a dataset 58.</summary>
/// <param name="Direction">0 scalar, ±1…3 translation, ±4…6 rotation.</param>
internal sealed record ChannelField(string Entity, int Node, int Direction);
