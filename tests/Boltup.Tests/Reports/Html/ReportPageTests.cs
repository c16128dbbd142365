using System.Numerics;
using System.Text;
using System.Text.Json;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;
using Boltup.Reports;
using Boltup.Reports.Html;

namespace Boltup.Tests.Reports.Html;

public sealed class ReportPageTests
{
    [Fact]
    public void Verdict_TwoQuantities_HighestOfEach()
    {
        ReportPage page = ReportPage.Of(TinyResult.Plain, [TinyResult.Input], "1.2.3");

        Assert.Equal(3, page.Verdict.Count);
        Assert.Contains("ear, left in idle, strongest line 20 Hz", page.Verdict[0]);
        Assert.Contains("re 1 µm/s²", page.Verdict[1]);
        Assert.Equal("No warnings.", page.Verdict[2]);
    }

    [Fact]
    public void Charts_PeakAmplitude_LevelsAreRmsAndSilenceIsAGap()
    {
        PredictionResult result = TinyResult.Of(TinyResult.Operation(amplitude: Amplitude.Peak, responses: [TinyResult.Ear]));
        IReadOnlyList<float> levels = ReportPage.Of(result, [], "1").Charts.Single().Lines.Single().Decibels;

        Assert.Equal(20 * Math.Log10(5 / Math.Sqrt(2) / 20e-6), levels[0], 4);
        Assert.True(float.IsNaN(levels[1]));
    }

    [Fact]
    public void Charts_TwoOperations_OneChartPerResponse()
    {
        PredictionResult result = TinyResult.Of(
            TinyResult.Operation("idle", responses: [TinyResult.Ear]), TinyResult.Operation("full", responses: [TinyResult.Ear]));

        Assert.Equal(["idle", "full"], ReportPage.Of(result, [], "1").Charts.Single().Lines.Select(line => line.Operation));
    }

    [Fact]
    public void Paths_RankedByForcesAndJoints_AreTables()
    {
        Assert.Equal(TinyPaths.Operation.RankedPaths.Count, ReportPage.Of(TinyPaths.Predicted, [], "1").Paths.Count);
        Assert.Contains("Change if halved in dB", Html(TinyPaths.Predicted), StringComparison.Ordinal);
    }

    [Fact]
    public void Write_SameInput_SameBytes() => Assert.Equal(Html(TinyPaths.Predicted), Html(TinyPaths.Predicted));

    [Fact]
    public void Write_AnyPage_NamesNoOtherPlace()
    {
        string html = Html(TinyResult.Plain);

        Assert.DoesNotContain("http:", html, StringComparison.Ordinal);
        Assert.DoesNotContain("https:", html, StringComparison.Ordinal);
        Assert.DoesNotContain(" src=", html, StringComparison.Ordinal);
    }

    [Fact]
    public void Write_HostileNames_AreTextAndNeverMarkup()
    {
        ResponseSpectrum hostile = TinyResult.Ear with { Name = "</script><script>alert(1)</script>", Dof = "a\"><b>" };
        string html = Html(TinyResult.Of(TinyResult.Operation("<i>idle", responses: [hostile])));

        Assert.DoesNotContain("<script>alert", html, StringComparison.Ordinal);
        Assert.DoesNotContain("<i>", html, StringComparison.Ordinal);
        Assert.DoesNotContain("\"><b>", html, StringComparison.Ordinal);
    }

    [Fact]
    public void Write_Warning_IsCountedAndExplained()
    {
        var warning = new Diagnostic(ReportCodes.CannotWrite, Severity.Warning, "an invented complaint");
        string html = Html(TinyResult.Plain with { Diagnostics = [warning] });

        Assert.Contains("One warning", html, StringComparison.Ordinal);
        Assert.Contains("an invented complaint", html, StringComparison.Ordinal);
        Assert.Contains(PageMarkup.Text(ReportCodes.CannotWrite.Meaning), html, StringComparison.Ordinal);
    }

    [Fact]
    public void Write_TwentyResponsesOfEightThousandLines_StaysUnderTenMegabytes()
    {
        FrequencyAxis axis = FrequencyAxis.FromHertz([.. Enumerable.Range(1, 8000).Select(line => 0.25 * line)]);
        Complex[] values = [.. Enumerable.Range(1, 8000).Select(line => new Complex(Math.Sin(line), 1.0 / line))];
        ResponseSpectrum[] responses = [.. Enumerable.Range(1, 20).Select(i => TinyResult.Ear with { Name = $"ear {i}", Values = values })];
        PredictionResult result = TinyResult.Plain with { Axis = axis, Operations = [new OperationResult("idle", axis, Amplitude.Rms, responses, [])] };

        Assert.InRange(Html(result).Length, 20 * 8000 * 4, 2_000_000);
    }

    [Fact]
    public void Data_Levels_ReadBackFromBase64()
    {
        string html = Html(TinyResult.Plain);
        const string opening = "id=\"data\">";
        int start = html.IndexOf(opening, StringComparison.Ordinal) + opening.Length;
        using JsonDocument data = JsonDocument.Parse(html[start..html.IndexOf("</script>", start, StringComparison.Ordinal)]);
        byte[] axis = data.RootElement.GetProperty("axes")[0].GetBytesFromBase64();

        Assert.Equal(50.5f, BitConverter.ToSingle(axis, 4));
        Assert.Equal(2, data.RootElement.GetProperty("charts").GetArrayLength());
    }

    [Fact]
    public void DarkLines_OnDarkPaper_StandOut() =>
        Assert.All(PageColours.DarkLines, colour => Assert.True(colour.ContrastWith(PageColours.DarkPaper) >= 4.5));

    private static string Html(PredictionResult result)
    {
        using var stream = new MemoryStream();
        PageRenderer.Write(stream, result, [TinyResult.Input], "1.2.3");
        return Encoding.UTF8.GetString(stream.ToArray());
    }
}
