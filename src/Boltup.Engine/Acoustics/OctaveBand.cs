using System.Globalization;

namespace Boltup.Engine.Acoustics;

/// <summary>
/// One band of an octave or a fraction of it, with exact centre and edges of the base-10 system: G = 10^0.3, centres G^(i/b) around 1 kHz
/// for odd b and G^((2i+1)/2b) for even b, edges G^(±1/2b) away (IEC 61260-1:2014).
/// </summary>
/// <param name="PerOctave">Bands in an octave, b: 1 or 3.</param>
/// <param name="Index">Distance from the band around 1 kHz.</param>
public readonly record struct OctaveBand(int PerOctave, int Index)
{
    private const double LogOctave = 0.3;

    /// <summary>Nominal centres of a decade of third octaves, as names.</summary>
    private static readonly double[] Nominal = [1, 1.25, 1.6, 2, 2.5, 3.15, 4, 5, 6.3, 8];

    public double CentreHz => 1000 * Math.Pow(10, LogOctave * Index / PerOctave);

    public double LowerHz => 1000 * Math.Pow(10, LogOctave * (Index - 0.5) / PerOctave);

    public double UpperHz => 1000 * Math.Pow(10, LogOctave * (Index + 0.5) / PerOctave);

    /// <summary>The centre as people call it: 31.5 Hz for 31.62 Hz.</summary>
    public double NominalHz
    {
        get
        {
            int tenths = Index * 3 / PerOctave;
            int decade = (int)Math.Floor(tenths / 10.0);
            return Math.Round(Nominal[tenths - 10 * decade] * Math.Pow(10, 3 + decade), 6);
        }
    }

    /// <summary>The band that holds a frequency.</summary>
    public static OctaveBand Of(double hz, int perOctave = 3) => new(perOctave, (int)Math.Floor(perOctave * Math.Log10(hz / 1000) / LogOctave + 0.5));

    public override string ToString() => string.Create(CultureInfo.InvariantCulture, $"{NominalHz:0.###} Hz");
}
