using System.Text;

namespace Boltup.Reports.Pictures;

/// <summary>Gives every picture a file name of its own: different names of operations and responses may be spelled the same.</summary>
internal static class PictureNames
{
    /// <summary>File systems take 255 bytes; the rest is for the number and the ending.</summary>
    private const int LongestName = 200;

    public static IReadOnlyList<Picture> MakeDistinct(IReadOnlyList<Picture> pictures)
    {
        var taken = new HashSet<string>(StringComparer.Ordinal);
        return [.. pictures.Select(picture => picture with { Name = Free(Short(picture.Name), taken) })];
    }

    private static string Free(string name, HashSet<string> taken)
    {
        string free = name;
        for (int i = 2; !taken.Add(free); i++)
        {
            free = FormattableString.Invariant($"{name}-{i}");
        }

        return free;
    }

    private static string Short(string name)
    {
        while (Encoding.UTF8.GetByteCount(name) > LongestName)
        {
            name = name[..^1];
        }

        return name;
    }
}
