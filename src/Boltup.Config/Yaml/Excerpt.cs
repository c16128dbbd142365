namespace Boltup.Config.Yaml;

/// <summary>User text shortened for a message.</summary>
internal static class Excerpt
{
    private const int UsualLength = 60;

    /// <summary>The text on one line without control characters, cut when it is long.</summary>
    public static string Of(string text, int maximumLength = UsualLength)
    {
        string cut = text.Length > maximumLength ? string.Concat(text.AsSpan(0, maximumLength), "…") : text;
        return string.Create(cut.Length, cut, static (target, source) =>
        {
            for (int i = 0; i < source.Length; i++)
            {
                target[i] = char.IsControl(source[i]) ? ' ' : source[i];
            }
        });
    }
}
