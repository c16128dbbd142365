using System.Globalization;
using Boltup.Engine.Acoustics;
using Boltup.Engine.Evidence;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Identification;

/// <summary>The band in which blocked forces hold, and why it ends there.</summary>
public sealed record ForceBand(double FromHz, double ToHz, string Because)
{
    /// <summary>Difference in a third octave up to which forces are said to hold (common practice).</summary>
    public const double LimitDb = 3;

    /// <summary>The widest run of third octaves in which every on-board validation is within <see cref="LimitDb"/>.</summary>
    public static ForceBand Of(FrequencyAxis axis, IReadOnlyList<OperationValidation> validations)
    {
        ValidationReport[] onBoard = [.. validations.Where(each => each.Report.Check == ValidationCheck.OnBoard).Select(each => each.Report)];
        if (onBoard.Length == 0)
        {
            return new ForceBand(axis.FirstHz, axis.LastHz, "the data end there; nothing was validated");
        }

        var bands = new BandSums(axis);
        bool[] fine = [.. bands.Bands.Select((_, band) => bands.LinesIn(band) == 0 || onBoard.All(report => Math.Abs(ValidationBands.Difference(report, bands, band)) <= LimitDb))];
        (int first, int last) = LongestRun(fine);
        if (last < first)
        {
            return new ForceBand(axis.FirstHz, axis.LastHz, string.Create(CultureInfo.InvariantCulture, $"the data end there; no third octave is within {LimitDb} dB at the validation sensors"));
        }

        double from = Math.Max(axis.FirstHz, bands.Bands[first].LowerHz), to = Math.Min(axis.LastHz, bands.Bands[last].UpperHz);
        return new ForceBand(Rounded(from), Rounded(to), Reason(axis, bands, first, last));
    }

    private static string Reason(FrequencyAxis axis, BandSums bands, int first, int last)
    {
        string below = first == 0 ? "the data begin there" : string.Create(CultureInfo.InvariantCulture, $"below, the validation sensors are off by more than {LimitDb} dB in the band {bands.Bands[first - 1]}");
        string above = last == bands.Bands.Count - 1 ? "the data end there" : string.Create(CultureInfo.InvariantCulture, $"above, the validation sensors are off by more than {LimitDb} dB in the band {bands.Bands[last + 1]}");
        return first == 0 && last == bands.Bands.Count - 1
            ? string.Create(CultureInfo.InvariantCulture, $"the data begin and end there; on board, all third octaves are within {LimitDb} dB")
            : $"{below}; {above}";
    }

    private static (int First, int Last) LongestRun(bool[] fine)
    {
        (int First, int Last) best = (0, -1);
        int start = 0;
        for (int i = 0; i <= fine.Length; i++)
        {
            if (i == fine.Length || !fine[i])
            {
                best = i - start > best.Last - best.First + 1 ? (start, i - 1) : best;
                start = i + 1;
            }
        }

        return best;
    }

    private static double Rounded(double hz) => double.Parse(hz.ToString("G4", CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);
}
