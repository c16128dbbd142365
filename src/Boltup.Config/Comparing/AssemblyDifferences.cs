using Boltup.Config.Documents;
using Boltup.Engine.Comparing;

namespace Boltup.Config.Comparing;

/// <summary>In what the inputs of two assemblies differ, with bases merged in, down to the content of data files.</summary>
public sealed class AssemblyDifferences
{
    private AssemblyDifferences(IReadOnlyList<InputDifference> items) => Items = items;

    /// <summary>In the order in which the keys of an assembly are documented.</summary>
    public IReadOnlyList<InputDifference> Items { get; }

    /// <summary>Whether a result can depend on what differs.</summary>
    public bool MatterToResults => Items.Any(item => !item.IsRemark);

    public static AssemblyDifferences Of(AssemblyDocument before, AssemblyDocument changed) =>
        new(new NodeComparison(new FileContents(before, changed)).Compare(before.Root, changed.Root, AssemblyShape.Root));

    /// <summary>Whether a part is the same on both sides, its place and data files included.</summary>
    public bool LeavePart(string name) => !Items.Any(item => !item.IsRemark && IsOf(item.Path, $"parts.{name}"));

    private static bool IsOf(string path, string owner) =>
        path.StartsWith(owner, StringComparison.Ordinal) && (path.Length == owner.Length || path[owner.Length] is '.' or '[');
}
