using System.Numerics;
using Boltup.Engine.Acoustics;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Paths;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Targets;

/// <summary>Judges responses by targets.</summary>
public static class TargetCheck
{
    /// <summary>One verdict for each target and operation that it holds for.</summary>
    public static IReadOnlyList<TargetVerdict> Run(
        IReadOnlyList<Target> targets, IReadOnlyList<OperationResult> operations, DiagnosticBag diagnostics)
    {
        var verdicts = new List<TargetVerdict>();
        foreach (Target target in targets)
        {
            foreach (OperationResult operation in operations.Where(each => target.Operations.Count == 0 || target.Operations.Contains(each.Name)))
            {
                TargetVerdict verdict = Judge(target, operation);
                verdicts.Add(verdict);
                SayNotJudged(verdict, operation, diagnostics);
                SayThinBands(target, operation, diagnostics);
            }
        }

        return verdicts;
    }

    private static TargetVerdict Judge(Target target, OperationResult operation)
    {
        int index = operation.Responses.TakeWhile(response => response.Name != target.Response).Count();
        ResponseSpectrum response = operation.Responses[index];
        LevelReference reference = LevelReference.For(response.Quantity, response.Unit);
        double[] power = [.. response.Values.Select(value => MeanSquare(value, operation.Amplitude))];
        (TargetLimit Limit, PathLimit Lines)[] limits = [.. LimitsOf(target, operation.Axis, reference)];
        if (limits.Length == 0)
        {
            return new TargetVerdict(target, operation.Name, double.NaN, target.Limits[0].Decibels, target.Limits[0].Band, reference, null);
        }

        (TargetLimit limit, double level) = limits
            .Select(each => (each.Limit, Level: 10 * Math.Log10(Sum(each.Lines.Lines, power)) - 20 * Math.Log10(reference.Value)))
            .MinBy(each => each.Limit.Decibels - each.Level);
        RequiredReduction? reduction = level > limit.Decibels && operation.Paths is { } paths
            ? RequiredReduction.Of(paths, index, [.. limits.Select(each => each.Lines)])
            : null;
        return new TargetVerdict(target, operation.Name, level, limit.Decibels, limit.Band, reference, reduction);
    }

    /// <summary>Limits on weighted sums of mean squares; third octaves without a line are left out.</summary>
    private static IEnumerable<(TargetLimit Limit, PathLimit Lines)> LimitsOf(Target target, FrequencyAxis axis, LevelReference reference)
    {
        var sums = new BandSums(axis);
        foreach (TargetLimit limit in target.Limits)
        {
            double[] factors = [.. Enumerable.Range(0, axis.Count).Select(line => Counts(target, axis[line]) ? target.Weighting.PowerFactor(axis[line]) : 0)];
            if (limit.Band is { } band)
            {
                int place = sums.Bands.TakeWhile(each => each != band).Count();
                factors = place < sums.Bands.Count && sums.LinesIn(place) > 0 ? Shared(factors, sums.PartsOf(place)) : [.. factors.Select(_ => 0.0)];
            }

            if (factors.Any(factor => factor > 0))
            {
                yield return (limit, new PathLimit(new LineWeights(0, factors), Math.Pow(10, limit.Decibels / 10) * reference.Value * reference.Value));
            }
        }
    }

    private static double[] Shared(double[] factors, IReadOnlyList<(int Line, double Share)> parts)
    {
        var shared = new double[factors.Length];
        foreach ((int line, double share) in parts)
        {
            shared[line] = share * factors[line];
        }

        return shared;
    }

    private static bool Counts(Target target, double hz) =>
        hz >= (target.FromHz ?? 0) * (1 - FrequencyAxis.RelativeTolerance) && hz <= (target.ToHz ?? double.PositiveInfinity) * (1 + FrequencyAxis.RelativeTolerance);

    private static double Sum(LineWeights weights, double[] power) => power.Select((value, line) => weights.FactorAt(line) * value).Sum();

    private static double MeanSquare(Complex value, Amplitude amplitude) =>
        (value.Real * value.Real + value.Imaginary * value.Imaginary) * (amplitude == Amplitude.Peak ? 0.5 : 1);

    private static void SayThinBands(Target target, OperationResult operation, DiagnosticBag diagnostics)
    {
        var sums = new BandSums(operation.Axis);
        OctaveBand[] thin = [.. sums.Bands.Where((band, i) => sums.LinesIn(i) is > 0 and < BandSums.FewestLines && target.Limits.Any(limit => limit.Band == band))];
        if (thin.Length > 0)
        {
            diagnostics.Warning(
                EngineCodes.FewLinesInBand,
                $"target `{target.Name}`: third octaves with fewer than {BandSums.FewestLines} lines of operation `{operation.Name}`: {string.Join(", ", thin)}",
                target.Origin,
                "use finer lines, or limit the level over a wider band with `limit`, `from` and `to`");
        }
    }

    private static void SayNotJudged(TargetVerdict verdict, OperationResult operation, DiagnosticBag diagnostics)
    {
        if (!verdict.IsJudged)
        {
            diagnostics.Warning(
                EngineCodes.TargetOutsideBand,
                $"target `{verdict.Target.Name}` has no line in common with operation `{verdict.Operation}`: it is not judged",
                verdict.Target.Origin,
                "correct the band of the target, or compute at its frequencies",
                $"computed: {operation.Axis}");
        }
    }
}
