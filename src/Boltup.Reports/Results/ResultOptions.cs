namespace Boltup.Reports.Results;

/// <summary>What to write, and by whom.</summary>
public sealed record ResultOptions(string ProgramVersion, bool Pictures = true);
