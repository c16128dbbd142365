namespace Boltup.Config;

/// <summary>How documents are loaded.</summary>
public sealed record LoadOptions
{
    private const long Mebibyte = 1L << 20;

    /// <summary>Whether files outside the tree of the repository, or of the top document's folder, may be named.</summary>
    public bool AllowOutsidePaths { get; init; }

    /// <summary>Whether data files must be those that the pins beside the assembly name, where there are pins.</summary>
    public bool ChecksPins { get; init; } = true;

    /// <summary>The folder from which the user sees files; paths in messages are relative to it.</summary>
    public string WorkingDirectory { get; init; } = Directory.GetCurrentDirectory();

    /// <summary>Largest YAML document in bytes.</summary>
    public long MaximumDocumentBytes { get; init; } = 4 * Mebibyte;

    /// <summary>Largest data file in bytes.</summary>
    public long MaximumDataBytes { get; init; } = 16 * 1024 * Mebibyte;

    /// <summary>Most documents in a chain of <c>based_on</c>, the top one included.</summary>
    public int MaximumBaseDepth { get; init; } = 16;
}
