namespace Boltup.Cli.Commands;

/// <summary>How a comparison is printed.</summary>
internal enum ComparisonForm
{
    /// <summary>Differences, levels and the verdict.</summary>
    Concise,

    /// <summary>Third octaves, edits and paths of every response as well.</summary>
    Full,

    /// <summary>For programs.</summary>
    Json,

    /// <summary>For a pull request.</summary>
    Markdown,
}
