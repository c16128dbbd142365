using Boltup.Engine.Diagnostics;
using Boltup.Engine.Prediction;
using Boltup.Reports.Results;

namespace Boltup.Reports.Html;

/// <summary>What <c>report.html</c> says, before it becomes markup.</summary>
/// <param name="Verdict">Sentences for somebody who reads nothing else.</param>
/// <param name="Charts">One per response, in the order of the assembly.</param>
/// <param name="Levels">One per operation and response.</param>
/// <param name="Paths">One per operation, response and view; empty where nobody asked for paths.</param>
public sealed record ReportPage(
    string Title,
    string Provenance,
    IReadOnlyList<string> Verdict,
    IReadOnlyList<PageLevel> Levels,
    IReadOnlyList<PageChart> Charts,
    IReadOnlyList<PagePaths> Paths,
    IReadOnlyList<Diagnostic> Diagnostics,
    IReadOnlyList<InputFingerprint> Inputs)
{
    public static ReportPage Of(PredictionResult result, IReadOnlyList<InputFingerprint> inputs, string programVersion)
    {
        PageLevel[] levels = [.. result.Operations.SelectMany(PageLevel.Of)];
        return new ReportPage(
            result.Title,
            $"boltup {programVersion} · inputs {InputFingerprint.Abbreviate(inputs)} · kernels {result.Kernels}",
            PageVerdict.Of(levels, result),
            levels,
            PageChart.Of(result),
            [.. result.Operations.SelectMany(PagePaths.Of)],
            result.Diagnostics,
            inputs);
    }
}
