namespace Boltup.Reports.Results;

/// <summary>What to write, and by whom.</summary>
public sealed record ResultOptions(string ProgramVersion, bool Pictures = true)
{
    /// <summary>Whether to write every contribution at every line.</summary>
    public bool PathLines { get; init; }
}
