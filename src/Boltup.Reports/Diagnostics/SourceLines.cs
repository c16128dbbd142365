namespace Boltup.Reports.Diagnostics;

/// <summary>Lines of the files that diagnostics point at, each file read once.</summary>
internal sealed class SourceLines
{
    /// <summary>Larger files are data; their lines are not worth the reading.</summary>
    private const long LargestFile = 16 << 20;

    private readonly Dictionary<string, string[]> _files = [];

    /// <summary>A line counted from 1, or null where the file has none or cannot be read again.</summary>
    public string? Find(string file, int line)
    {
        if (!_files.TryGetValue(file, out string[]? lines))
        {
            lines = Read(file);
            _files.Add(file, lines);
        }

        return line >= 1 && line <= lines.Length ? lines[line - 1] : null;
    }

    private static string[] Read(string file)
    {
        try
        {
            var info = new FileInfo(file);
            return info.Exists && info.Length <= LargestFile ? File.ReadAllLines(file) : [];
        }
        catch (Exception exception) when (exception is IOException or UnauthorizedAccessException or ArgumentException)
        {
            return [];
        }
    }
}
