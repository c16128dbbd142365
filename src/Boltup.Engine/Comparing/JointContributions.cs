using System.Runtime.Intrinsics;
using Boltup.Engine.Prediction;
using Boltup.Engine.Sensitivity;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Comparing;

/// <summary>
/// Powers of what each joint contributes to each response over all lines, |Kλ|², and of what the forces on the response's own part add:
/// u − ΣKλ. See <see cref="Paths.PathTransfers"/>.
/// </summary>
internal static class JointContributions
{
    /// <summary>For each response the mean squares by the names of the paths; where nothing is joined, none.</summary>
    /// <param name="operation">Place of the operation in the assembly.</param>
    public static IReadOnlyList<IReadOnlyDictionary<string, double>> Of(PredictionRun run, int operation, FrequencyAxis lines)
    {
        int responses = run.Assembly.Responses.Count;
        int paths = run.Layout.Constraints.Count + 1;
        if (paths == 1 || responses == 0)
        {
            return [.. Enumerable.Repeat(new Dictionary<string, double>(), responses)];
        }

        int tiles = run.Assembly.Axis.TileCount;
        double[] parts = new double[tiles * responses * paths];
        var values = new ResponseTiles(run, lines);
        Parallel.For(0, tiles, tile => Fill(run, run.Cases[operation], values, tile, parts.AsSpan(tile * responses * paths, responses * paths)));
        double[] sums = new double[responses * paths];
        for (int i = 0; i < parts.Length; i++)
        {
            sums[i % sums.Length] += parts[i];
        }

        double toRms = run.Assembly.Operations[operation].Amplitude == Amplitude.Peak ? 0.5 : 1;
        return [.. Enumerable.Range(0, responses).Select(response => Collect(run, operation, response, sums.AsSpan(response * paths, paths), toRms))];
    }

    private static void Fill(PredictionRun run, Range cases, ResponseTiles values, int tile, Span<double> powers)
    {
        (int first, int count) = cases.GetOffsetAndLength(run.Cases.Count);
        int constraints = run.Layout.Constraints.Count;
        Vector512<double> weights = values.Weights(tile);
        ReadOnlySpan<double> lambda = run.Solution.JointForces.Tile(tile);
        ReadOnlySpan<double> transfers = run.Transfers.FromJoints.Tile(tile);
        for (int i = 0; i < run.Assembly.Responses.Count * count; i++)
        {
            (int response, int column) = (i / count, first + i % count);
            LaneComplex rest = values.At(tile, response, column);
            for (int joint = 0; joint < constraints; joint++)
            {
                LaneComplex contribution = LaneComplex.At(transfers, response * constraints + joint) * LaneComplex.At(lambda, joint * run.Cases.Count + column);
                powers[response * (constraints + 1) + joint] += Vector512.Sum(weights * contribution.Square);
                rest -= contribution;
            }

            powers[response * (constraints + 1) + constraints] += Vector512.Sum(weights * rest.Square);
        }
    }

    private static Dictionary<string, double> Collect(PredictionRun run, int operation, int response, ReadOnlySpan<double> sums, double toRms)
    {
        var powers = new Dictionary<string, double>();
        for (int joint = 0; joint < run.Layout.Constraints.Count; joint++)
        {
            if (run.Transfers.Touches(joint, response))
            {
                powers[run.Layout.Constraints[joint].ToString()] = toRms * sums[joint];
            }
        }

        string part = run.Assembly.Responses[response].Part;
        if (run.Assembly.Operations[operation].Forces.Any(set => set.Part == part))
        {
            powers[$"forces on {part}"] = toRms * sums[^1];
        }

        return powers;
    }
}
