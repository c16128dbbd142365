using Boltup.Engine.Paths;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Sensitivity;

/// <summary>
/// Derivatives of overall levels L = 10 lg Σ|u|²: dL/dln p = (20/ln 10) Σ Re(u* ∂u/∂ln p) / Σ|u|², with ∂u from the adjoint of the
/// interface problem.
/// </summary>
internal sealed class SensitivityAnalysis(PredictionRun run)
{
    private const double Percent = 0.01;

    private static readonly double DecibelsPerNeper = 20 / Math.Log(10);

    private readonly SensitivityLayout _layout = new(run);

    /// <summary>Adds the derivatives to the result of an operation that has its paths.</summary>
    /// <param name="index">Place of the operation in the assembly.</param>
    public OperationResult AddTo(OperationResult result, int index)
    {
        int responses = run.Assembly.Responses.Count;
        double[] powers = new double[responses];
        double[] sums = new double[responses * _layout.Parameters.Count];
        if (run.Layout.Constraints.Count > 0 && responses > 0)
        {
            Sum(run.Cases[index], result.Axis, powers, sums);
        }

        return result with { Sensitivities = [.. run.Assembly.Responses.Select((response, i) => Collect(result, response, i, powers[i], sums))] };
    }

    /// <summary>Tiles in parallel, then added in their order: the sums do not depend on the number of threads.</summary>
    private void Sum(Range cases, FrequencyAxis lines, double[] powers, double[] sums)
    {
        int tiles = run.Assembly.Axis.TileCount;
        double[] tilePowers = new double[tiles * powers.Length];
        double[] tileSums = new double[tiles * sums.Length];
        var responses = new ResponseTiles(run, lines);
        Parallel.For(0, tiles, () => new SensitivityKernel(run, _layout, responses), (tile, _, kernel) =>
        {
            kernel.Fill(
                tile, cases, tilePowers.AsSpan(tile * powers.Length, powers.Length), tileSums.AsSpan(tile * sums.Length, sums.Length));
            return kernel;
        }, _ => { });
        AddTiles(tilePowers, powers);
        AddTiles(tileSums, sums);
    }

    private static void AddTiles(double[] tiles, double[] sums)
    {
        for (int i = 0; i < tiles.Length; i++)
        {
            sums[i % sums.Length] += tiles[i];
        }
    }

    private ResponseSensitivities Collect(OperationResult result, Response response, int index, double power, double[] sums)
    {
        ResponsePaths forces = result.RankedPaths.First(paths => paths.Response == response.Name && paths.View == PathView.Forces);
        IEnumerable<LevelSensitivity> parameters = _layout.Parameters.Select((parameter, i) => new LevelSensitivity(
            parameter, ToDecibels(parameter.Kind, (sums[index * _layout.Parameters.Count + i] + OwnRow(parameter, response) * power) / power)));

        // The share of a contribution is its derivative: Re(c u*)/|u|² dB per dB.
        return new ResponseSensitivities(response.Name, [.. parameters, .. forces.Overall.Paths.Select(path =>
            new LevelSensitivity(new SensitivityParameter(SensitivityKind.Force, path.Path.Name), path.Share))]);
    }

    private static double ToDecibels(SensitivityKind kind, double ratio) => kind == SensitivityKind.FrfRow ? ratio : Percent * DecibelsPerNeper * ratio;

    /// <summary>1 for the row that is read as the response itself, too.</summary>
    private static double OwnRow(SensitivityParameter parameter, Response response) =>
        parameter.Kind == SensitivityKind.FrfRow && parameter.Name == $"{response.Part}.{response.Dof}" ? 1 : 0;
}
