using System.Globalization;
using System.Text;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Prediction;
using Boltup.Reports.Results;
using static Boltup.Reports.Html.PageMarkup;

namespace Boltup.Reports.Html;

/// <summary>Writes <c>report.html</c>: one file that needs no other and no network.</summary>
public static class PageRenderer
{
    private static readonly string[] Method =
    [
        "Every part is described by its frequency response functions (FRFs), measured or modelled.",
        "Motion is handled as displacement; velocity and acceleration differ from it by the angular frequency.",
        "Parts are joined where the assembly says, rigidly or through mounts with their dynamic stiffness.",
        "Joining keeps the motion of both ends of a joint compatible and their forces in balance (LM-FBS).",
        "For each frequency the forces in the joints are the solution of one linear problem of the interface.",
        "The source acts through the forces that the operation states: blocked forces belong to the source alone.",
        "They reproduce responses of the receiver and forces in the joints, not responses inside the source.",
        "Spectra are rms per line; peak values are divided by the root of two first.",
        "An overall level is the root of the summed powers of the lines, in dB re the reference stated.",
        "A contribution is what one force or joint adds; contributions add with their phases, so shares may exceed one.",
    ];

    public static void Write(Stream output, PredictionResult result, IReadOnlyList<InputFingerprint> inputs, string programVersion)
    {
        ReportPage page = ReportPage.Of(result, inputs, programVersion);
        var html = new StringBuilder();
        html.Append("<!doctype html>\n<html lang=\"en\">\n<head>\n<meta charset=\"utf-8\">\n")
            .Append("<meta name=\"viewport\" content=\"width=device-width, initial-scale=1\">\n<meta name=\"color-scheme\" content=\"light dark\">\n")
            .Append("<meta http-equiv=\"Content-Security-Policy\" content=\"default-src 'none'; style-src 'unsafe-inline'; script-src 'unsafe-inline'; img-src data:\">\n")
            .Append(CultureInfo.InvariantCulture, $"<title>{Text(page.Title)}</title>\n<style>{PageColours.Style()}\n{Resource("report.css")}</style>\n</head>\n<body>\n")
            .Append(CultureInfo.InvariantCulture, $"<header><h1>{Text(page.Title)}</h1><p class=\"quiet\">{Text(page.Provenance)}</p></header>\n<main>\n");
        AppendSections(html, page);
        html.Append(CultureInfo.InvariantCulture, $"</main>\n<script type=\"application/json\" id=\"data\">{PageData.Json(page, result)}</script>\n")
            .Append(CultureInfo.InvariantCulture, $"<script>{Resource("report.js")}</script>\n</body>\n</html>\n");
        output.Write(Encoding.UTF8.GetBytes(html.ToString()));
    }

    private static void AppendSections(StringBuilder html, ReportPage page)
    {
        Section(html, "Verdict", List("ul", page.Verdict));
        Section(html, "Levels", Levels(page.Levels));
        Section(html, "Spectra", "<noscript><p>The diagrams need a browser with scripts; the tables do not.</p></noscript>\n" + string.Concat(page.Charts.Select(Chart)));
        if (page.Paths.Count > 0)
        {
            Section(html, "Contributions", string.Concat(page.Paths.Select(Paths)));
        }

        Section(html, "Warnings and notes", page.Diagnostics.Count == 0 ? "<p>None.</p>\n" : string.Concat(page.Diagnostics.Select(Explained)));
        Section(html, "Inputs", Table("Inputs and their fingerprints", ["File", "SHA-256"], page.Inputs.Select(input => new[] { Cell(input.File), Cell(input.Sha256) })));
        Section(html, "Method", List("ol", Method));
        Section(html, "Cautions", $"<p>{Text(Cautions.Text)}</p>\n");
    }

    private static string Levels(IReadOnlyList<PageLevel> levels) => Table(
        "Overall levels",
        ["Operation", "Response", "Place", "Level", "Re", "Strongest line in Hz"],
        levels.Select(level => new[]
        {
            Cell(level.Operation), Cell(level.Response), Cell(level.Dof), Number(level.Level.Decibels, level.Level.Text),
            Cell(level.Level.Reference.Text), Number(level.Level.PeakHz, level.Level.PeakHz.ToString("G5", CultureInfo.InvariantCulture)),
        }));

    private static string Chart(PageChart chart, int index) => string.Create(
        CultureInfo.InvariantCulture,
        $"<figure class=\"chart\" data-chart=\"{index}\"><figcaption>{Text(chart.Response)} <span class=\"quiet\">{Text(chart.Dof)}, dB re {Text(chart.Reference)}</span></figcaption></figure>\n");

    private static string Paths(PagePaths paths) => Table(
        $"{paths.Response} in {paths.Operation}, by {PathTables.NameOf(paths.View)}",
        ["Path", $"Level in dB re {paths.Reference.Text}", "Share", "Change if halved in dB"],
        paths.Ranked.Select(path => new[]
        {
            Cell(path.Path.Name), Number(paths.Reference.Decibels(Math.Sqrt(path.Power)), "F1"), Number(path.Share, "F3"),
            Number(path.HalvedChange, SignedText.Of(path.HalvedChange, 1)),
        }));

    private static string Explained(Diagnostic item) =>
        $"<details><summary><strong>{item.Severity.ToString().ToLowerInvariant()} {Text(item.Code.Code)}</strong> {Text(item.Message)}</summary>\n"
        + List("ul", item.Notes) + $"<p>{Text(item.Code.Meaning)}</p>\n<p>{Text(item.Code.Cure)}</p>\n" + List("ul", item.Helps) + "</details>\n";
}
