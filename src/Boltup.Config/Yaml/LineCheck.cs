using Boltup.Engine.Diagnostics;

namespace Boltup.Config.Yaml;

/// <summary>
/// Looks at the beginnings of lines: YAML forbids tabs there, and parsers disagree on what they mean; a directive in the wrong
/// place makes the parser skip text without a word.
/// </summary>
internal static class LineCheck
{
    public static bool IsClean(string[] lines, SourceFile file, DiagnosticBag diagnostics)
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
            else if (lines[i].StartsWith('%'))
            {
                found++;
                diagnostics.Error(ConfigCodes.Tag, "a line that begins with `%` is a directive: directives are not read",
                    new SourceSpan(file.DisplayPath, i + 1, 1, lines[i].Length), "remove the line");
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
