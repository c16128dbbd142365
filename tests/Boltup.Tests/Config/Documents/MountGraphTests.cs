using Boltup.Config.Documents;

namespace Boltup.Tests.Config.Documents;

public class MountGraphTests
{
    [Fact]
    public void Circular_UsersOfACircle_AreNotOnIt() =>
        Assert.Equal(["b", "c"], Graph("a: b", "b: c", "c: b d", "d:", "e: a a").Circular());

    [Fact]
    public void Circular_PartsOfACircle_AreNotOnIt() =>
        Assert.Equal(["a"], Graph("a: a b", "b: c", "c:").Circular());

    [Fact]
    public void CountElements_NestedMounts_MultipliesUpToTheLimit()
    {
        Dictionary<string, int> counts = Graph("soft:", "like: soft", "pair: soft like", "four: pair pair", "loop: loop").CountElements(3);
        Assert.Equal((1, 1, 2, 3), (counts["soft"], counts["like"], counts["pair"], counts["four"]));
        Assert.DoesNotContain("loop", counts.Keys);
    }

    [Fact]
    public void CountElements_ChainOfManyThousands_NeedsNoStack()
    {
        string[] chain = [.. Enumerable.Range(1, 50_000).Select(i => FormattableString.Invariant($"m{i}: m{i - 1} m{i - 1}")), "m0:"];
        Assert.Equal(65, Graph(chain).CountElements(65)["m50000"]);
    }

    private static MountGraph Graph(params string[] mounts) => new(mounts.ToDictionary(
        mount => mount[..mount.IndexOf(':', StringComparison.Ordinal)],
        IReadOnlyList<string> (mount) => mount[(mount.IndexOf(':', StringComparison.Ordinal) + 1)..].Split(' ', StringSplitOptions.RemoveEmptyEntries)));
}
