namespace Boltup.Config.Pinning;

/// <summary>How the data files of an assembly differ from its pins.</summary>
/// <param name="Changed">Files with another content than pinned.</param>
/// <param name="Added">Files that are not pinned.</param>
/// <param name="Dropped">Pinned paths that the assembly does not read.</param>
public sealed record PinChange(IReadOnlyList<string> Changed, IReadOnlyList<string> Added, IReadOnlyList<string> Dropped)
{
    public bool IsNone => Changed.Count + Added.Count + Dropped.Count == 0;
}
