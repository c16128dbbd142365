using System.Globalization;
using System.Text;
using System.Text.Encodings.Web;
using System.Text.Unicode;

namespace Boltup.Reports.Html;

/// <summary>The few pieces of markup that the page is made of.</summary>
internal static class PageMarkup
{
    private static readonly HtmlEncoder Encoder = HtmlEncoder.Create(UnicodeRanges.All);

    public static string Text(string text) => Encoder.Encode(text);

    /// <summary>A style or script of the page, kept in a file of its own beside this one.</summary>
    public static string Resource(string name)
    {
        using var reader = new StreamReader(typeof(PageMarkup).Assembly.GetManifestResourceStream(name)!);
        return reader.ReadToEnd();
    }

    public static void Section(StringBuilder html, string heading, string content) =>
        html.Append(CultureInfo.InvariantCulture, $"<section><h2>{heading}</h2>\n{content}</section>\n");

    public static string List(string kind, IReadOnlyList<string> items) =>
        items.Count == 0 ? "" : $"<{kind}>{string.Concat(items.Select(item => $"<li>{Text(item)}</li>"))}</{kind}>\n";

    /// <summary>A table that the script lets the reader sort; wide ones scroll, also by keyboard.</summary>
    public static string Table(string caption, IReadOnlyList<string> heads, IEnumerable<string[]> rows) =>
        $"<div class=\"wide\" tabindex=\"0\" role=\"region\" aria-label=\"{Text(caption)}\"><table><caption>{Text(caption)}</caption>\n<thead><tr>"
        + string.Concat(heads.Select(head => $"<th scope=\"col\">{Text(head)}</th>"))
        + "</tr></thead>\n<tbody>"
        + string.Concat(rows.Select(cells => $"<tr>{string.Concat(cells)}</tr>\n"))
        + "</tbody></table></div>\n";

    public static string Cell(string text) => $"<td>{Text(text)}</td>";

    /// <summary>A number, which sorts by its value and shows as a format or a finished text says; a dash where there is none.</summary>
    public static string Number(double value, string shown)
    {
        bool isFormat = shown.Length == 2 && shown[0] == 'F';
        string text = !isFormat ? shown : double.IsFinite(value) ? value.ToString(shown, CultureInfo.InvariantCulture).Replace('-', '−') : "–";
        string sortsBy = double.IsFinite(value) ? value.ToString("R", CultureInfo.InvariantCulture) : "";
        return $"<td class=\"number\" data-value=\"{sortsBy}\">{Text(text)}</td>";
    }
}
