namespace Boltup.Files.Text;

/// <summary>Takes blanks away; the library's generic methods for this are compiled at start-up, which costs more than their work.</summary>
internal static class Blanks
{
    public static ReadOnlySpan<byte> Trim(ReadOnlySpan<byte> text)
    {
        int start = 0;
        while (start < text.Length && text[start] == ' ')
        {
            start++;
        }

        return TrimEnd(text[start..]);
    }

    public static ReadOnlySpan<byte> TrimEnd(ReadOnlySpan<byte> text)
    {
        int end = text.Length;
        while (end > 0 && text[end - 1] == ' ')
        {
            end--;
        }

        return text[..end];
    }
}
