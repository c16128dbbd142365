using Boltup.Engine.Spectra;

namespace Boltup.Engine.Acoustics;

/// <summary>
/// Finds discrete tones in a power spectrum and rates them by prominence ratio and tone-to-noise ratio (ECMA-418-1, from memory). Adjacent
/// critical bands are the ones that join without a gap. A tone is a run of lines each more than 6 dB above the median line of its
/// critical band, around one that is higher than its neighbours, at most 15 % of the critical band wide or a single line; the 6 dB are this
/// program's choice, because the standard leaves finding tones to inspection.
/// </summary>
public sealed class Tonality
{
    /// <summary>Range in which tones are rated.</summary>
    public const double FirstHz = 89.1, LastHz = 11220;

    private const double LowestHz = 20;
    private const double StandsOut = 3.98107170553497;
    private const double WidestShare = 0.15;
    private const double PartialBandHz = 100;
    private const int FewestNoiseLines = 5;

    private readonly FrequencyAxis _axis;
    private readonly double[] _power;
    private readonly BandSums _cells;

    private Tonality(PowerSpectrum spectrum) => (_axis, _power, _cells) = (spectrum.Axis, spectrum.Power, new BandSums(spectrum.Axis));

    /// <summary>The tones of an unweighted spectrum, upwards.</summary>
    public static IReadOnlyList<Tone> Of(PowerSpectrum spectrum)
    {
        var tonality = new Tonality(spectrum);
        return [.. Enumerable.Range(0, spectrum.Axis.Count).Select(tonality.Rate).OfType<Tone>()];
    }

    private Tone? Rate(int line)
    {
        if (_axis[line] is < FirstHz or > LastHz || !IsPeak(line))
        {
            return null;
        }

        CriticalBand band = CriticalBand.Around(_axis[line]);
        int[] lines = [.. LinesIn(band)];
        if (lines.Length <= FewestNoiseLines || line < lines[0] || line > lines[^1])
        {
            return null;
        }

        double threshold = StandsOut * Median(lines);
        (int first, int last) = (line, line);
        for (; first > lines[0] && _power[first - 1] > threshold; first--)
        {
        }

        for (; last < lines[^1] && _power[last + 1] > threshold; last++)
        {
        }

        bool isTone = _power[line] > threshold && (first == last || Width(first, last) <= WidestShare * band.WidthHz);
        return isTone && Enumerable.Range(first, last - first + 1).All(other => _power[other] <= _power[line])
            ? new Tone(_axis[line], Prominence(band), ToneToNoise(band, lines, threshold, first, last))
            : null;
    }

    private bool IsPeak(int line) =>
        _power[line] > 0 && (line == 0 || _power[line] >= _power[line - 1]) && (line == _axis.Count - 1 || _power[line] > _power[line + 1]);

    private double Prominence(CriticalBand band)
    {
        CriticalBand below = band.Below(LowestHz), above = band.Above();
        if (below.LowerHz < _axis.FirstHz - _cells.CellWidthHz(0) || above.UpperHz > _axis.LastHz + _cells.CellWidthHz(_axis.Count - 1))
        {
            return double.NaN;
        }

        // A band that 20 Hz cuts short is taken as 100 Hz wide, as every whole band down there is.
        double lower = Power(below) * (below.LowerHz <= LowestHz ? PartialBandHz / below.WidthHz : 1);
        return 10 * Math.Log10(Power(band) / ((lower + Power(above)) / 2));
    }

    private double ToneToNoise(CriticalBand band, int[] lines, double threshold, int first, int last)
    {
        int[] noise = [.. lines.Where(line => _power[line] <= threshold)];
        double noiseWidth = noise.Sum(_cells.CellWidthHz);
        double noisePower = noise.Sum(line => _power[line]) * band.WidthHz / noiseWidth;
        double tone = Enumerable.Range(first, last - first + 1).Sum(line => _power[line]);
        return noise.Length < FewestNoiseLines || noisePower <= 0 ? double.NaN : 10 * Math.Log10(tone / noisePower);
    }

    private double Width(int first, int last) => Enumerable.Range(first, last - first + 1).Sum(_cells.CellWidthHz);

    /// <summary>Power in a band, lines split at its edges.</summary>
    private double Power(CriticalBand band)
    {
        double sum = 0;
        for (int line = 0; line < _axis.Count; line++)
        {
            sum += _cells.ShareOf(line, band.LowerHz, band.UpperHz) * _power[line];
        }

        return sum;
    }

    private IEnumerable<int> LinesIn(CriticalBand band) =>
        Enumerable.Range(0, _axis.Count).Where(line => _axis[line] >= band.LowerHz && _axis[line] <= band.UpperHz);

    private double Median(int[] lines)
    {
        double[] sorted = [.. lines.Select(line => _power[line]).Order()];
        return sorted[sorted.Length / 2];
    }
}
