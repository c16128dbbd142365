namespace Boltup.Engine.Comparing;

/// <summary>How two inputs differ.</summary>
public enum InputDifferenceKind
{
    /// <summary>Another value.</summary>
    Changed,

    /// <summary>Only in the changed assembly.</summary>
    Added,

    /// <summary>Only in the base.</summary>
    Removed,

    /// <summary>Another content of a data file.</summary>
    Content,
}
