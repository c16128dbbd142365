namespace Boltup.Tests.Config;

/// <summary>A text in which <c>«…»</c> marks the place where a diagnostic is expected.</summary>
internal sealed record MarkedText(string Text, int Line, int Column, int Length)
{
    public static MarkedText Parse(string marked)
    {
        int open = marked.IndexOf('«', StringComparison.Ordinal);
        int close = marked.IndexOf('»', StringComparison.Ordinal);
        string before = marked[..open];
        return new MarkedText(
            marked.Replace("«", "", StringComparison.Ordinal).Replace("»", "", StringComparison.Ordinal),
            before.Count(c => c == '\n') + 1,
            open - before.LastIndexOf('\n'),
            close - open - 1);
    }
}
