namespace Boltup.Config.Documents;

/// <summary>Which mounts are made of which others, by <c>like</c>, <c>series</c> and <c>parallel</c>.</summary>
/// <param name="madeOf">Every mount with the mounts that its law names; all of them are keys.</param>
internal sealed class MountGraph(IReadOnlyDictionary<string, IReadOnlyList<string>> madeOf)
{
    /// <summary>The names that lie on a circle, in the order of the mounts.</summary>
    public IEnumerable<string> Circular()
    {
        var left = new HashSet<string>(madeOf.Keys, StringComparer.Ordinal);
        left.ExceptWith(InOrder());
        ILookup<string, string> users = Edges().ToLookup(edge => edge.Part, edge => edge.Whole);
        Strip(left, users, madeOf);
        return madeOf.Keys.Where(left.Contains);
    }

    /// <summary>For every mount that is on no circle, the number of laws of their own that it is made of, up to a limit.</summary>
    public Dictionary<string, int> CountElements(int limit)
    {
        var counts = new Dictionary<string, int>(StringComparer.Ordinal);
        foreach (string name in InOrder())
        {
            int count = madeOf[name].Aggregate(0, (sum, part) => Math.Min(limit, sum + counts[part]));
            counts.Add(name, madeOf[name].Count == 0 ? 1 : count);
        }

        return counts;
    }

    /// <summary>Mounts after everything that they are made of; those that lead to a circle are missing.</summary>
    private List<string> InOrder()
    {
        ILookup<string, string> users = Edges().ToLookup(edge => edge.Part, edge => edge.Whole);
        var missing = madeOf.ToDictionary(mount => mount.Key, mount => mount.Value.Distinct().Count(), StringComparer.Ordinal);
        List<string> order = [.. madeOf.Keys.Where(name => missing[name] == 0)];
        for (int i = 0; i < order.Count; i++)
        {
            order.AddRange(users[order[i]].Where(user => --missing[user] == 0));
        }

        return order;
    }

    private IEnumerable<(string Whole, string Part)> Edges() =>
        madeOf.SelectMany(mount => mount.Value.Distinct().Select(part => (mount.Key, part)));

    /// <summary>Takes away what no remaining mount is made of, until nothing more goes.</summary>
    private static void Strip(HashSet<string> left, ILookup<string, string> users, IReadOnlyDictionary<string, IReadOnlyList<string>> madeOf)
    {
        var leaving = new Queue<string>(left.Where(name => !users[name].Any(left.Contains)));
        while (leaving.TryDequeue(out string? name))
        {
            left.Remove(name);
            foreach (string part in madeOf[name].Where(part => left.Contains(part) && !users[part].Any(left.Contains)))
            {
                leaving.Enqueue(part);
            }
        }
    }
}
