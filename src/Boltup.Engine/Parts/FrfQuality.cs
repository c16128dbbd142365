using System.Globalization;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Parts;

/// <summary>
/// Judges FRFs of a passive structure between dofs that were measured both ways: driving points must not generate power (Im receptance ≤ 0
/// with e^{+jωt}, ISO 7626-1), and Y must be symmetric (reciprocity). Reports, never repairs.
/// </summary>
public static class FrfQuality
{
    /// <summary>Share of the power at a driving point that noise may turn round before it is worth a warning.</summary>
    private const double TolerableShare = 0.1;

    /// <summary>Mean of |Yᵢⱼ − Yⱼᵢ| over the mean of |Yᵢⱼ| + |Yⱼᵢ| from which a pair is worth a warning (common practice: about 1 dB).</summary>
    private const double TolerableAsymmetry = 0.06;

    /// <summary>Share of the driving points below which an FRF is zero for all that matters, and its two directions may differ as they like.</summary>
    private const double Negligible = 1e-3;

    /// <summary>Checks the interface FRFs of a part.</summary>
    /// <param name="dofs">Names of the first rows and columns of the matrix, which are the same dofs.</param>
    /// <param name="frf">Receptances; further rows and columns are ignored.</param>
    public static void Check(
        string part, SourceSpan? origin, FrequencyAxis axis, IReadOnlyList<DofCombination> dofs, TiledMatrix frf, DiagnosticBag diagnostics)
    {
        FrfPlace[] places = [.. dofs.Select((dof, i) => new FrfPlace(dof.ToString()!, i, i))];
        Judge($"part `{part}`", origin, Measure(axis, places, frf), diagnostics);
    }

    /// <summary>Measures the dofs of motion that are both rows and columns.</summary>
    /// <param name="frf">Receptances.</param>
    public static FrfQualityReport Measure(FrfMatrix frf) => Measure(frf.Axis, FrfPlace.InBoth(frf.Rows, frf.Columns), frf.Values);

    /// <summary>Says what is worth a warning.</summary>
    /// <param name="owner">What the FRFs belong to, as messages begin.</param>
    public static void Judge(string owner, SourceSpan? origin, FrfQualityReport report, DiagnosticBag diagnostics)
    {
        foreach (DrivingPointPower point in report.DrivingPoints.Where(point => point.GeneratedShare > TolerableShare))
        {
            diagnostics.Warning(
                EngineCodes.PowerGenerated,
                $"{owner}: the driving point `{point.Dof}` generates power at {point.GeneratingHz.Count} of {report.Lines} lines",
                origin,
                "check sign, axis and quantity of the FRF: a flipped sensor, conjugated FRFs, or accelerance taken for receptance look like this",
                $"at {FrequencyList.Of(point.GeneratingHz)}");
        }

        SayLeastReciprocal(owner, origin, report.Pairs, diagnostics);
    }

    private static FrfQualityReport Measure(FrequencyAxis axis, FrfPlace[] places, TiledMatrix frf)
    {
        var pairs = new List<ReciprocityPair>();
        for (int i = 0; i < places.Length; i++)
        {
            pairs.AddRange(places[..i].Select(other => new ReciprocityPair(places[i].Name, other.Name, Asymmetry(frf, places[i], other))));
        }

        return new FrfQualityReport(axis.Count, [.. places.Select(place => PowerAt(axis, place, frf))], pairs);
    }

    private static DrivingPointPower PowerAt(FrequencyAxis axis, FrfPlace place, TiledMatrix frf)
    {
        double generated = 0;
        double total = 0;
        List<double> generatingHz = [];
        for (int line = 0; line < axis.Count; line++)
        {
            double power = axis.Omega(line) * frf[line, place.Row, place.Column].Imaginary;
            total += Math.Abs(power);
            if (power > 0)
            {
                generated += power;
                generatingHz.Add(axis[line]);
            }
        }

        return new DrivingPointPower(place.Name, total > 0 ? generated / total : 0, generatingHz);
    }

    private static void SayLeastReciprocal(
        string owner, SourceSpan? origin, IReadOnlyList<ReciprocityPair> pairs, DiagnosticBag diagnostics)
    {
        ReciprocityPair[] suspects = [.. pairs.Where(pair => pair.Asymmetry > TolerableAsymmetry).OrderByDescending(pair => pair.Asymmetry)];
        if (suspects.Length > 0)
        {
            diagnostics.Warning(
                EngineCodes.NotReciprocal,
                $"{owner}: {suspects.Length} pair{(suspects.Length == 1 ? "" : "s")} of interface FRFs {(suspects.Length == 1 ? "is" : "are")} not reciprocal",
                origin,
                "check position, direction and calibration of sensor and hammer at these dofs",
                $"largest asymmetry: {string.Join(", ", suspects.Take(5).Select(Describe))}");
        }
    }

    private static string Describe(ReciprocityPair pair) =>
        string.Create(CultureInfo.InvariantCulture, $"`{pair.First}` and `{pair.Second}` ({pair.Asymmetry:P0})");

    private static double Asymmetry(TiledMatrix frf, FrfPlace first, FrfPlace second)
    {
        double difference = 0;
        double sum = 0;
        double driving = 0;
        for (int tile = 0; tile < frf.TileCount; tile++)
        {
            ReadOnlySpan<double> a = frf.Entry(tile, first.Row, second.Column);
            ReadOnlySpan<double> b = frf.Entry(tile, second.Row, first.Column);
            ReadOnlySpan<double> own = frf.Entry(tile, first.Row, first.Column);
            ReadOnlySpan<double> other = frf.Entry(tile, second.Row, second.Column);
            for (int lane = 0; lane < Tiling.Lanes; lane++)
            {
                int imaginary = lane + Tiling.Lanes;
                difference += Length(a[lane] - b[lane], a[imaginary] - b[imaginary]);
                sum += Length(a[lane], a[imaginary]) + Length(b[lane], b[imaginary]);
                driving += 2 * Math.Sqrt(Length(own[lane], own[imaginary]) * Length(other[lane], other[imaginary]));
            }
        }

        double size = Math.Max(sum, Negligible * driving);
        return size > 0 ? difference / size : 0;
    }

    private static double Length(double real, double imaginary) => Math.Sqrt(real * real + imaginary * imaginary);
}
