namespace Boltup.Cli.Terminal;

/// <summary>How diagnostics are printed.</summary>
internal enum MessageForm
{
    /// <summary>With the line concerned, notes and cures.</summary>
    Full,

    /// <summary>One line each, for editors.</summary>
    Lines,

    /// <summary>For programs.</summary>
    Json,
}
