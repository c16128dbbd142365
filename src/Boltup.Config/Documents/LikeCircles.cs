namespace Boltup.Config.Documents;

/// <summary>Finds mounts that are like each other in a circle.</summary>
internal static class LikeCircles
{
    /// <summary>The names that lie on a circle, each once, in the order of the mounts.</summary>
    /// <param name="laws">The mounts that are like another one.</param>
    public static IEnumerable<string> In(IReadOnlyDictionary<string, LikeLawDocument> laws)
    {
        var walkOf = new Dictionary<string, int>(StringComparer.Ordinal);
        var circular = new HashSet<string>(StringComparer.Ordinal);
        int walk = 0;
        foreach (string start in laws.Keys)
        {
            walk++;
            string name = start;
            while (laws.TryGetValue(name, out LikeLawDocument? law) && walkOf.TryAdd(name, walk))
            {
                name = law.Mount.Value;
            }

            bool meetsItself = walkOf.TryGetValue(name, out int met) && met == walk;
            while (meetsItself && circular.Add(name))
            {
                name = laws[name].Mount.Value;
            }
        }

        return laws.Keys.Where(circular.Contains);
    }
}
