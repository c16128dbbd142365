using Boltup.Engine.Diagnostics;
using YamlDotNet.Core;

namespace Boltup.Config.Yaml;

/// <summary>Turns the marks of the parser into spans that stay on one line.</summary>
internal sealed class SpanFactory(SourceFile file, string[] lines)
{
    public SourceFile File { get; } = file;

    /// <summary>From one mark to another; cut at the end of the first line, at least one character long.</summary>
    public SourceSpan Between(Mark start, Mark end)
    {
        if (start.Line > lines.Length)
        {
            return new SourceSpan(File.DisplayPath, lines.Length, Math.Max(1, lines[^1].Length));
        }

        int line = (int)Math.Max(1, start.Line);
        int column = (int)Math.Clamp(start.Column, 1, lines[line - 1].Length + 1);
        long stop = end.Line == start.Line ? end.Column : lines[line - 1].AsSpan().TrimEnd().Length + 1;
        return new SourceSpan(File.DisplayPath, line, column, (int)Math.Max(1, stop - column));
    }

    public SourceSpan At(Mark mark) => Between(mark, mark);

    /// <summary>A collection with its brackets, or null when it is not written with them.</summary>
    public SourceSpan? Brackets(Mark start, Mark end)
    {
        if (CharacterAt(start) is not ('{' or '['))
        {
            return null;
        }

        SourceSpan span = Between(start, end);
        bool endsHere = end.Line == start.Line && CharacterAt(end) is '}' or ']';
        return endsHere ? span with { Length = (int)(end.Column - start.Column) + 1 } : span;
    }

    private char? CharacterAt(Mark mark)
    {
        string line = lines[Math.Clamp(mark.Line, 1, lines.Length) - 1];
        return mark.Column >= 1 && mark.Column <= line.Length ? line[(int)mark.Column - 1] : null;
    }

    /// <summary>A word that begins at a mark and ends before the next blank, comma or bracket.</summary>
    public SourceSpan Word(Mark mark)
    {
        SourceSpan start = At(mark);
        string line = lines[start.Line - 1];
        int end = start.Column - 1;
        while (end < line.Length && line[end] is not (' ' or '\t' or ',' or '[' or ']' or '{' or '}'))
        {
            end++;
        }

        return start with { Length = Math.Max(1, end - start.Column + 1) };
    }
}
