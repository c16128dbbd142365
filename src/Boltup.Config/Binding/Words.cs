namespace Boltup.Config.Binding;

/// <summary>Lists of names in messages.</summary>
internal static class Words
{
    private const int MaximumListed = 12;

    /// <summary>The names in backticks with commas between them; a long list is cut.</summary>
    public static string List(IEnumerable<string> names)
    {
        string[] all = [.. names];
        string listed = string.Join(", ", all.Take(MaximumListed).Select(name => $"`{name}`"));
        return all.Length > MaximumListed ? $"{listed} and {all.Length - MaximumListed} more" : listed;
    }

    /// <summary>A note that lists the known names of something, or says that there are none.</summary>
    public static string Known(string plural, IReadOnlyCollection<string> names) =>
        names.Count == 0 ? $"there are no {plural}" : $"known {plural}: {List(names)}";
}
