using Boltup.Files.Text;

namespace Boltup.Files.UniversalFile;

/// <summary>Finds the end of a binary record whose sizes are wrong.</summary>
internal static class DelimiterSearch
{
    private const int Window = 1 << 16;

    /// <summary>
    /// Offset of the next delimiter that is followed by another one or by the end of the file, or −1. Both together hardly ever occur
    /// within binary data.
    /// </summary>
    public static long FindEnd(ByteSource source, long from)
    {
        var buffer = new byte[Math.Min(Window, source.Length)];
        long start = from;
        while (start < source.Length)
        {
            int filled = source.ReadAt(start, buffer);
            ReadOnlySpan<byte> window = buffer.AsSpan(0, filled);
            for (int at = 0; at < filled;)
            {
                int found = window[at..].IndexOf("    -1"u8);
                if (found < 0)
                {
                    break;
                }

                at += found;
                if (Ends(source, start + at + 6))
                {
                    return start + at;
                }

                at++;
            }

            // Delimiters that straddle the edge of the window are found in the next one.
            start += Math.Max(1, filled - 6);
            if (filled < buffer.Length)
            {
                break;
            }
        }

        return -1;
    }

    private static bool Ends(ByteSource source, long offset)
    {
        Span<byte> next = stackalloc byte[96];
        ReadOnlySpan<byte> rest = next[..source.ReadAt(offset, next)];
        int line = rest.IndexOf((byte)'\n');
        bool isRestBlank = (line < 0 ? rest : rest[..line]).Trim(" \r"u8).IsEmpty;
        return isRestBlank && (line < 0 || rest[(line + 1)..].IsEmpty || rest[(line + 1)..].StartsWith("    -1"u8));
    }
}
