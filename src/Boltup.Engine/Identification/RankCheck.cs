using System.Globalization;
using Boltup.Engine.Diagnostics;

namespace Boltup.Engine.Identification;

/// <summary>Says where the indicator FRFs cannot tell the forces apart.</summary>
internal static class RankCheck
{
    /// <summary>Condition number from which errors of the data of one percent fill the smallest direction several times over.</summary>
    private const double PoorCondition = 1e3;

    public static void Run(BenchModel bench, SingularSpectrum values, DiagnosticBag diagnostics)
    {
        double limit = bench.Indicators.Count * Math.ScaleB(1, -52);
        double[] lost = LinesWhere(values, condition => !(condition < 1 / limit));
        if (lost.Length > 0 && bench.Solve.Method == SolveMethod.LeastSquares)
        {
            diagnostics.Error(
                EngineCodes.IndicatorRankLost,
                $"the indicator FRFs are rank deficient at {lost.Length} of {values.Axis.Count} lines",
                help: "two interface dofs may hold the same FRFs, or an indicator file is empty; `solve: { method: truncated, below: 1e-6 }` leaves lost directions out",
                notes: $"at {FrequencyList.Of(lost)}");
            return;
        }

        double[] poor = LinesWhere(values, condition => condition >= PoorCondition);
        if (poor.Length > 0)
        {
            diagnostics.Note(
                EngineCodes.IndicatorsIllConditioned,
                string.Create(CultureInfo.InvariantCulture, $"the indicator FRFs have a condition number above 1000 at {poor.Length} of {values.Axis.Count} lines"),
                help: "single forces are uncertain there while what they do together may be good: judge by the validation, not by the forces",
                notes: $"at {FrequencyList.Of(poor)}");
        }
    }

    private static double[] LinesWhere(SingularSpectrum values, Func<double, bool> holds) =>
        [.. Enumerable.Range(0, values.Axis.Count).Where(line => holds(values.Condition(line))).Select(line => values.Axis[line])];
}
