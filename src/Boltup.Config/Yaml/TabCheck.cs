using Boltup.Engine.Diagnostics;

namespace Boltup.Config.Yaml;

/// <summary>Finds tabs in indentation: YAML forbids them there, and parsers disagree on what they mean.</summary>
internal static class TabCheck
{
    public static bool HasNone(string[] lines, SourceFile file, DiagnosticBag diagnostics)
    {
        int found = 0;
        for (int i = 0; i < lines.Length && found < YamlLimits.MaximumErrors; i++)
        {
            if (TabIn(lines[i]) is int column)
            {
                found++;
                diagnostics.Error(ConfigCodes.TabIndentation, "a tab in the indentation",
                    new SourceSpan(file.DisplayPath, i + 1, column), "indent with spaces");
            }
        }

        return found == 0;
    }

    private static int? TabIn(string line)
    {
        int content = 0;
        while (content < line.Length && line[content] is ' ' or '\t')
        {
            content++;
        }

        int tab = line.IndexOf('\t', 0, content);
        bool isBlank = content == line.Length || line[content] == '#';
        return tab < 0 || isBlank ? null : tab + 1;
    }
}
