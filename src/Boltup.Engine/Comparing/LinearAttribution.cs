using System.Runtime.Intrinsics;
using Boltup.Engine.Prediction;
using Boltup.Engine.Sensitivity;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Comparing;

/// <summary>
/// What each edit does to the levels of the base by itself, to first order, from the adjoints of the base: ΔL = (20/ln 10) Σ Re(u* du)/Σ|u|².
/// </summary>
internal sealed class LinearAttribution(PredictionRun before, PredictionRun changed)
{
    private static readonly double DecibelsPerNeper = 20 / Math.Log(10);

    private readonly AttributionPlan _plan = new(before, changed);

    public IReadOnlyList<string> NotAttributed => _plan.NotAttributed;

    /// <summary>The effects on every response of the base in an operation, the largest first; edits without any effect are left out.</summary>
    /// <param name="index">Place of the operation in the base.</param>
    /// <param name="other">Its place in the changed assembly.</param>
    public IReadOnlyList<IReadOnlyList<AttributedChange>> Of(int index, int other, FrequencyAxis lines)
    {
        int responses = before.Assembly.Responses.Count;
        int causes = _plan.Causes.Count;
        (int first, int count) = before.Cases[index].GetOffsetAndLength(before.Cases.Count);
        (int otherFirst, int otherCount) = changed.Cases[other].GetOffsetAndLength(changed.Cases.Count);
        if (causes == 0 || responses == 0 || count != otherCount)
        {
            return [.. Enumerable.Repeat<IReadOnlyList<AttributedChange>>([], responses)];
        }

        double[] sums = Sum(before.Cases[index], otherFirst - first, lines, responses * causes);
        return [.. Enumerable.Range(0, responses).Select(response => Collect(
            sums.AsSpan(response * causes, causes), PowerOf(response, first, count, lines)))];
    }

    /// <summary>Tiles in parallel, then added in their order: the sums do not depend on the number of threads.</summary>
    private double[] Sum(Range cases, int shift, FrequencyAxis lines, int length)
    {
        int tiles = before.Assembly.Axis.TileCount;
        double[] parts = new double[tiles * length];
        var responses = new ResponseTiles(before, lines);
        Parallel.For(0, tiles, () => new AttributionKernel(before, changed, _plan, responses), (tile, _, kernel) =>
        {
            kernel.Fill(tile, cases, shift, parts.AsSpan(tile * length, length));
            return kernel;
        }, _ => { });
        double[] sums = new double[length];
        for (int i = 0; i < parts.Length; i++)
        {
            sums[i % length] += parts[i];
        }

        return sums;
    }

    private double PowerOf(int response, int first, int count, FrequencyAxis lines)
    {
        var tiles = new ResponseTiles(before, lines);
        double power = 0;
        for (int tile = 0; tile < before.Assembly.Axis.TileCount; tile++)
        {
            for (int column = first; column < first + count; column++)
            {
                power += Vector512.Sum(tiles.Weights(tile) * tiles.At(tile, response, column).Square);
            }
        }

        return power;
    }

    private AttributedChange[] Collect(ReadOnlySpan<double> sums, double power)
    {
        var changes = new List<AttributedChange>();
        for (int cause = 0; cause < sums.Length; cause++)
        {
            if (sums[cause] != 0 && power > 0)
            {
                changes.Add(new AttributedChange(_plan.Causes[cause], DecibelsPerNeper * sums[cause] / power));
            }
        }

        return [.. changes.OrderByDescending(change => Math.Abs(change.Decibels))];
    }
}
