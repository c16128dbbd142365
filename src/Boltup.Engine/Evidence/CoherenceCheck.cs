using System.Globalization;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Evidence;

/// <summary>Judges the coherence of a set of FRFs (ISO 7626-2; common practice for the limits).</summary>
public static class CoherenceCheck
{
    /// <summary>Mean coherence below which a line is reported.</summary>
    private const double Low = 0.8;

    /// <summary>What single-precision text may add to 1 or take from 0.</summary>
    private const double Rounding = 1e-5;

    private const int WeakestShown = 10;

    /// <summary>Checks and sums up.</summary>
    /// <param name="owner">What the FRFs belong to, as messages begin.</param>
    /// <param name="coherence">γ² of each FRF as real parts.</param>
    /// <param name="averages">Number of averages behind each, at least 1.</param>
    /// <returns>The figures, or null after an error in <paramref name="diagnostics"/>.</returns>
    public static CoherenceReport? Check(
        string owner, SourceSpan? origin, FrfMatrix coherence, int averages, DiagnosticBag diagnostics)
    {
        ArgumentOutOfRangeException.ThrowIfLessThan(averages, 1);
        if (averages == 1)
        {
            RefuseOneAverage(owner, origin, diagnostics);
            return null;
        }

        if (FirstOutside(coherence) is { } place)
        {
            RefuseOutside(owner, origin, coherence, place, diagnostics);
            return null;
        }

        CoherenceReport report = SumUp(coherence, averages);
        Judge(owner, origin, report, diagnostics);
        return report;
    }

    private static void RefuseOneAverage(string owner, SourceSpan? origin, DiagnosticBag diagnostics) => diagnostics.Error(
        EngineCodes.OneAverage,
        $"{owner}: one average says nothing about coherence",
        origin,
        "leave `coherence` out, or give the number of averages that it was estimated from",
        "with one average the coherence is 1 at every line, whatever the noise");

    private static (int Line, int Row, int Column)? FirstOutside(FrfMatrix coherence)
    {
        for (int row = 0; row < coherence.Rows.Count; row++)
        {
            for (int column = 0; column < coherence.Columns.Count; column++)
            {
                for (int line = 0; line < coherence.Axis.Count; line++)
                {
                    if (!(coherence[line, row, column].Real is >= -Rounding and <= 1 + Rounding))
                    {
                        return (line, row, column);
                    }
                }
            }
        }

        return null;
    }

    private static void RefuseOutside(
        string owner, SourceSpan? origin, FrfMatrix coherence, (int Line, int Row, int Column) at, DiagnosticBag diagnostics) =>
        diagnostics.Error(
            EngineCodes.CoherenceOutOfRange,
            string.Create(
                CultureInfo.InvariantCulture,
                $"{owner}: the coherence of `{coherence.Rows[at.Row]}` / `{coherence.Columns[at.Column]}` is {coherence[at.Line, at.Row, at.Column].Real:G6} at {coherence.Axis[at.Line]:G6} Hz"),
            origin,
            "check that the file holds coherence and not an FRF, a percentage or a level in dB",
            "expected: a number from 0 to 1");

    private static CoherenceReport SumUp(FrfMatrix coherence, int averages)
    {
        int lines = coherence.Axis.Count;
        int frfs = coherence.Rows.Count * coherence.Columns.Count;
        var mean = new double[lines];
        double[] least = [.. Enumerable.Repeat(1.0, lines)];
        var weakest = new List<(DofPair Frf, double Mean)>();
        for (int i = 0; i < frfs; i++)
        {
            (int row, int column) = (i / coherence.Columns.Count, i % coherence.Columns.Count);
            double sum = 0;
            for (int line = 0; line < lines; line++)
            {
                double value = Math.Clamp(coherence[line, row, column].Real, 0, 1);
                sum += value;
                mean[line] += value / frfs;
                least[line] = Math.Min(least[line], value);
            }

            weakest.Add((new DofPair(coherence.Rows[row], coherence.Columns[column]), sum / lines));
        }

        return new CoherenceReport(
            coherence.Axis,
            averages,
            mean,
            least,
            LineBand.Where(coherence.Axis, line => mean[line] < Low),
            [.. weakest.OrderBy(entry => entry.Mean).Take(WeakestShown)]);
    }

    private static void Judge(string owner, SourceSpan? origin, CoherenceReport report, DiagnosticBag diagnostics)
    {
        if (report.Least.Min() == 1)
        {
            diagnostics.Warning(
                EngineCodes.CoherenceAlwaysOne,
                $"{owner}: the coherence is exactly 1 everywhere",
                origin,
                "check the number of averages: one average always gives 1, and so does a computed FRF without noise");
        }

        if (report.LowBands.Count > 0)
        {
            string[] bands = [.. report.LowBands.Select(band => band.ToString())];
            diagnostics.Warning(
                EngineCodes.LowCoherence,
                string.Create(CultureInfo.InvariantCulture, $"{owner}: the mean coherence is below {Low} at {report.LowBands.Sum(band => band.Lines)} of {report.Axis.Count} lines"),
                origin,
                "hit harder, average more, or leave the band out: what is identified there is mostly noise",
                $"in {string.Join(", ", bands.Take(5))}{(bands.Length > 5 ? FormattableString.Invariant($" and {bands.Length - 5} more bands") : "")}",
                string.Create(CultureInfo.InvariantCulture, $"least explained: `{report.Weakest[0].Frf}` with a mean of {report.Weakest[0].Mean:F2}"));
        }
    }
}
