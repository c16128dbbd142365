using YamlDotNet.Core;

namespace Boltup.Config.Yaml;

/// <summary>Where and why the parser gave up.</summary>
/// <param name="Reason">Its own words, or null when it failed without any.</param>
internal sealed record ParserFailure(string? Reason, Mark Start, Mark End);
