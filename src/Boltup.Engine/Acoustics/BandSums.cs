using Boltup.Engine.Spectra;

namespace Boltup.Engine.Acoustics;

/// <summary>
/// Sums powers of lines into bands. A line stands for the cell up to half way to its neighbours; its power is split at a band edge in the
/// ratio of the parts of the cell (common practice, so that noise of constant density gives the power of the band).
/// </summary>
public sealed class BandSums
{
    /// <summary>Lines below which the splitting at its edges decides the level of a band more than the spectrum does.</summary>
    public const int FewestLines = 5;

    private readonly (int Line, double Share)[][] _parts;
    private readonly double[] _edges;

    /// <summary>The bands of the given fraction of an octave that lines of an axis reach into.</summary>
    /// <param name="axis">Lines above 0 Hz; a line at 0 Hz belongs to no band.</param>
    public BandSums(FrequencyAxis axis, int perOctave = 3)
    {
        double[] edges = _edges = CellEdges(axis);
        double lowest = Array.Find(edges, edge => edge > 0), highest = edges[^1];
        int first = OctaveBand.Of(lowest, perOctave).Index, last = OctaveBand.Of(highest * (1 - FrequencyAxis.RelativeTolerance), perOctave).Index;
        Bands = [.. Enumerable.Range(first, last - first + 1).Select(index => new OctaveBand(perOctave, index))];
        _parts = [.. Bands.Select(band => Parts(edges, band.LowerHz, band.UpperHz))];
    }

    /// <summary>Lowest first.</summary>
    public IReadOnlyList<OctaveBand> Bands { get; }

    /// <summary>Number of lines with more than half of their cell in a band.</summary>
    public int LinesIn(int band) => _parts[band].Count(part => part.Share > 0.5);

    /// <summary>The lines that reach into a band, adjacent and upwards, with the share of each line's power that falls into it.</summary>
    public IReadOnlyList<(int Line, double Share)> PartsOf(int band) => _parts[band];

    /// <summary>Width in Hz of the cell for which a line stands.</summary>
    public double CellWidthHz(int line) => _edges[line + 1] - _edges[line];

    /// <summary>The share of a line's cell that lies between two frequencies.</summary>
    public double ShareOf(int line, double lowerHz, double upperHz) =>
        Math.Max(0, Math.Min(_edges[line + 1], upperHz) - Math.Max(_edges[line], lowerHz)) / CellWidthHz(line);

    /// <summary>Sum of the powers in a band.</summary>
    /// <param name="power">Power of each line, such as the square of an rms value; not negative.</param>
    public double Sum(int band, IReadOnlyList<double> power)
    {
        double sum = 0;
        foreach ((int line, double share) in _parts[band])
        {
            sum += share * power[line];
        }

        return sum;
    }

    /// <summary>Edges of the cells, one more than lines: half way between neighbours, as far outside at the ends.</summary>
    private static double[] CellEdges(FrequencyAxis axis)
    {
        double[] edges = new double[axis.Count + 1];
        for (int i = 1; i < axis.Count; i++)
        {
            edges[i] = (axis[i - 1] + axis[i]) / 2;
        }

        // A single line has no neighbour: it is taken as a tone, in a cell that hardly has a width.
        double firstHalf = axis.Count > 1 ? edges[1] - axis[0] : FrequencyAxis.RelativeTolerance * axis[0];
        double lastHalf = axis.Count > 1 ? axis.LastHz - edges[^2] : firstHalf;
        edges[0] = Math.Max(0, axis[0] - firstHalf);
        edges[^1] = axis.LastHz + lastHalf;
        return edges;
    }

    private static (int Line, double Share)[] Parts(double[] edges, double lowerHz, double upperHz)
    {
        var parts = new List<(int, double)>();
        for (int line = 0; line < edges.Length - 1; line++)
        {
            double overlap = Math.Min(edges[line + 1], upperHz) - Math.Max(edges[line], lowerHz);
            if (overlap > 0)
            {
                parts.Add((line, overlap / (edges[line + 1] - edges[line])));
            }
        }

        return [.. parts];
    }
}
