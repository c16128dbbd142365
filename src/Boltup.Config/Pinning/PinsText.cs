using System.Globalization;
using System.Text;

namespace Boltup.Config.Pinning;

/// <summary>Writes a pins document: sorted, one file a line, so that a review shows a changed file as a changed line.</summary>
internal static class PinsText
{
    public static string Of(string assembly, IEnumerable<Pin> pins)
    {
        var text = new StringBuilder("boltup: pins/1\n");
        text.Append(CultureInfo.InvariantCulture, $"assembly: {Quoted(assembly)}\n");
        string[] lines = [.. pins.OrderBy(pin => pin.Path, StringComparer.Ordinal).Select(pin => $"  - {{ file: {Quoted(pin.Path)}, sha256: {Quoted(pin.Sha256)} }}\n")];
        text.Append(lines.Length == 0 ? "files: []\n" : "files:\n").AppendJoin("", lines);
        return text.ToString();
    }

    /// <summary>In quotes always: a path may hold anything, and other readers take some digests for numbers.</summary>
    private static string Quoted(string text) =>
        $"\"{text.Replace("\\", "\\\\", StringComparison.Ordinal).Replace("\"", "\\\"", StringComparison.Ordinal)}\"";
}
