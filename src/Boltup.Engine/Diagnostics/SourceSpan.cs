namespace Boltup.Engine.Diagnostics;

/// <summary>A place in an input file.</summary>
/// <param name="File">Path as the user would type it.</param>
/// <param name="Line">Line number from 1, or 0 when the whole file is meant.</param>
/// <param name="Column">Column in characters from 1, or 0 when the whole line is meant.</param>
/// <param name="Length">Length of the offending text in characters.</param>
/// <param name="ByteOffset">Offset from the start of a binary file, where a line means nothing.</param>
public sealed record SourceSpan(string File, int Line = 0, int Column = 0, int Length = 1, long? ByteOffset = null)
{
    public override string ToString() => (Line, Column, ByteOffset) switch
    {
        (0, _, null) => File,
        (0, _, long offset) => FormattableString.Invariant($"{File}:byte {offset}"),
        (_, 0, _) => FormattableString.Invariant($"{File}:{Line}"),
        _ => FormattableString.Invariant($"{File}:{Line}:{Column}"),
    };
}
