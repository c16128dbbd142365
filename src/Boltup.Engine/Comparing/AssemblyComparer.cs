using System.Numerics;
using Boltup.Engine.Acoustics;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Comparing;

/// <summary>Predicts two assemblies and says what became of the responses that both have.</summary>
public static class AssemblyComparer
{
    /// <summary>Parts that both assemblies hold as the same object are read once.</summary>
    /// <returns>The comparison, or null after an error in <paramref name="diagnostics"/>.</returns>
    public static ComparedPredictions? Compare(
        AssemblyModel before, AssemblyModel changed, DiagnosticBag diagnostics, CancellationToken cancellation = default)
    {
        var frfs = new PartFrfs();
        var found = new DiagnosticBag();
        if (Predictor.Run(before, frfs, diagnostics, cancellation) is not { } one)
        {
            return null;
        }

        (PredictionResult Result, PredictionRun Run)? second = Predictor.Run(changed, frfs, found, cancellation);
        diagnostics.AddUnsaid(found.Items);
        if (second is not { } other)
        {
            return null;
        }

        var attribution = new LinearAttribution(one.Run, other.Run);
        ResponseChange[] responses = [.. one.Result.Operations.SelectMany((_, i) => CompareOperation(one, i, other, attribution))];
        return new ComparedPredictions(
            one.Result, other.Result, responses, CompareTargets(one.Result, other.Result), MissingSides.Of(one.Result, other.Result), attribution.NotAttributed);
    }

    private static TargetChange[] CompareTargets(PredictionResult one, PredictionResult other) =>
        [.. one.Verdicts.SelectMany(verdict => other.Verdicts
            .Where(partner => MissingSides.AreSame(verdict, partner))
            .Select(partner => new TargetChange(verdict, partner)))];

    private static IEnumerable<ResponseChange> CompareOperation(
        (PredictionResult Result, PredictionRun Run) one, int index, (PredictionResult Result, PredictionRun Run) other, LinearAttribution attribution)
    {
        OperationResult before = one.Result.Operations[index];
        int place = other.Result.Operations.TakeWhile(operation => operation.Name != before.Name).Count();
        OperationResult? after = other.Result.Operations.ElementAtOrDefault(place);
        if (after is null || before.Axis.SharedWith(after.Axis) is not { } lines)
        {
            yield break;
        }

        IReadOnlyList<IReadOnlyList<AttributedChange>> causes = attribution.Of(index, place, lines);
        IReadOnlyList<IReadOnlyDictionary<string, double>> paths = JointContributions.Of(one.Run, index, lines);
        IReadOnlyList<IReadOnlyDictionary<string, double>> otherPaths = JointContributions.Of(other.Run, place, lines);
        var bands = new BandSums(lines);
        for (int i = 0; i < before.Responses.Count; i++)
        {
            if (MissingSides.Partner(before.Responses[i], after) is { } partner)
            {
                yield return CompareResponse((before, before.Responses[i]), (after, partner), bands, lines) with
                {
                    Paths = ComparePaths(paths[i], otherPaths[PlaceOf(partner, after)]),
                    Causes = causes[i],
                };
            }
        }
    }

    private static int PlaceOf(ResponseSpectrum response, OperationResult operation) =>
        operation.Responses.TakeWhile(candidate => candidate != response).Count();

    private static ResponseChange CompareResponse(
        (OperationResult Operation, ResponseSpectrum Response) before,
        (OperationResult Operation, ResponseSpectrum Response) after,
        BandSums bands,
        FrequencyAxis lines)
    {
        double[] basePowers = Powers(before.Operation, before.Response, lines);
        double[] changedPowers = Powers(after.Operation, after.Response, lines);
        IEnumerable<int> filled = Enumerable.Range(0, bands.Bands.Count).Where(band => bands.PartsOf(band).Count > 0);
        return new ResponseChange(
            before.Operation.Name,
            before.Response.Name,
            before.Response.Quantity,
            before.Response.Unit,
            lines,
            new LevelChange(basePowers.Sum(), changedPowers.Sum()),
            [.. filled.Select(band => new BandChange(bands.Bands[band], new LevelChange(bands.Sum(band, basePowers), bands.Sum(band, changedPowers))))],
            [],
            []);
    }

    private static double[] Powers(OperationResult operation, ResponseSpectrum response, FrequencyAxis lines)
    {
        double toRms = operation.Amplitude == Amplitude.Peak ? 0.5 : 1;
        return [.. lines.Hz.ToArray().Select(hz => toRms * Square(response.Values[operation.Axis.IndexOf(hz)]))];
    }

    private static double Square(Complex value) => value.Real * value.Real + value.Imaginary * value.Imaginary;

    private static PathChange[] ComparePaths(IReadOnlyDictionary<string, double> before, IReadOnlyDictionary<string, double> after) =>
        [.. before.Keys.Union(after.Keys)
            .Select(path => new PathChange(path, new LevelChange(before.GetValueOrDefault(path), after.GetValueOrDefault(path))))
            .OrderByDescending(path => path.Moved)];
}
