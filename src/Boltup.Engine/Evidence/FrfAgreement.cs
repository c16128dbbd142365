using System.Numerics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Evidence;

/// <summary>How well estimated FRFs Ŷ agree with measured ones Y, all entries together.</summary>
/// <param name="Consistency">
/// Per line |Σ Y Ŷ*|²/(Σ|Y|² Σ|Ŷ|²): 1 where both have the same pattern. Blind to a common factor, so it goes with
/// <paramref name="LevelDifferenceDb"/>; NaN for a single FRF, which has no pattern.
/// </param>
/// <param name="LevelDifferenceDb">Per line 10 lg Σ|Ŷ|²/Σ|Y|².</param>
/// <param name="RelativeError">‖Ŷ − Y‖/‖Y‖ over all entries and lines.</param>
/// <param name="OverallLevelDifferenceDb">10 lg Σ|Ŷ|²/Σ|Y|² over all entries and lines.</param>
public sealed record FrfAgreement(
    FrequencyAxis Axis,
    IReadOnlyList<double> Consistency,
    IReadOnlyList<double> LevelDifferenceDb,
    double RelativeError,
    double OverallLevelDifferenceDb)
{
    /// <summary>Compares FRFs between the same dofs at the same lines.</summary>
    public static FrfAgreement Of(FrfMatrix estimated, FrfMatrix measured)
    {
        SquareFrf.RequireLines(estimated.Axis, measured.Axis);
        if (!estimated.Rows.SequenceEqual(measured.Rows) || !estimated.Columns.SequenceEqual(measured.Columns))
        {
            throw new ArgumentException("estimated and measured FRFs must have the same rows and columns", nameof(estimated));
        }

        Dof[] responses = [.. measured.Rows.SelectMany(row => measured.Columns.Select(_ => row))];
        AgreementSums[] lines = AgreementSums.PerLine(responses, Spectra(estimated), Spectra(measured));
        AgreementSums total = AgreementSums.Total(lines);
        return new FrfAgreement(
            measured.Axis,
            [.. lines.Select(line => responses.Length > 1 ? line.Consistency : double.NaN)],
            [.. lines.Select(line => line.LevelDifferenceDb)],
            total.RelativeError,
            total.LevelDifferenceDb);
    }

    private static Complex[][] Spectra(FrfMatrix frf) =>
        [.. Enumerable.Range(0, frf.Rows.Count * frf.Columns.Count).Select(i => frf.Values.GatherSpectrum(i / frf.Columns.Count, i % frf.Columns.Count))];
}
