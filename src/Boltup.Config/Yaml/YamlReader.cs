using Boltup.Engine.Diagnostics;

namespace Boltup.Config.Yaml;

/// <summary>Reads one YAML document into nodes with marks; everything odd about it becomes a diagnostic.</summary>
public static class YamlReader
{
    private static readonly string[] LineEnds = ["\r\n", "\n", "\r"];

    /// <summary>The root of the document, or null when it has errors.</summary>
    public static YamlNode? Read(byte[] bytes, SourceFile file, DiagnosticBag diagnostics) =>
        TextDecoder.Decode(bytes, file, diagnostics) is string text ? Parse(text, file, diagnostics) : null;

    private static YamlNode? Parse(string text, SourceFile file, DiagnosticBag diagnostics)
    {
        string[] lines = text.Split(LineEnds, StringSplitOptions.None);
        if (!LineCheck.IsClean(lines, file, diagnostics))
        {
            return null;
        }

        var events = new EventStream(text);
        var builder = new NodeBuilder(events, new SpanFactory(file, lines), diagnostics);
        return builder.BuildDocument();
    }
}
