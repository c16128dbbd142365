using System.Text;

namespace Boltup.Reports.Comparing;

/// <summary>Text of a user inside Markdown: nothing in it marks anything up, ends a cell, makes an element or calls a person.</summary>
internal static class MarkdownText
{
    private const string Marks = "\\`*_{}[]|#~";

    public static string Of(string text)
    {
        var result = new StringBuilder(text.Length);
        foreach (char c in text)
        {
            switch (c)
            {
                case '<':
                    result.Append("&lt;");
                    break;
                case '>':
                    result.Append("&gt;");
                    break;
                case '&':
                    result.Append("&amp;");
                    break;
                case '@':
                    result.Append("&#64;");
                    break;
                case var control when char.IsControl(control):
                    result.Append(' ');
                    break;
                default:
                    result.Append(Marks.Contains(c, StringComparison.Ordinal) ? $"\\{c}" : c.ToString());
                    break;
            }
        }

        return result.ToString();
    }
}
