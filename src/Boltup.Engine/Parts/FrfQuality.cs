using System.Globalization;
using System.Numerics;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Parts;

/// <summary>
/// Judges square FRFs of a passive part: driving points must not generate power (Im receptance ≤ 0 with e^{+jωt}, ISO 7626-1), and
/// Y must be symmetric (reciprocity). Reports, never repairs.
/// </summary>
public static class FrfQuality
{
    /// <summary>Share of the power at a driving point that noise may turn round before it is worth a warning.</summary>
    private const double TolerableShare = 0.1;

    /// <summary>Mean of |Yᵢⱼ − Yⱼᵢ| over the mean of |Yᵢⱼ| + |Yⱼᵢ| from which a pair is worth a warning (common practice: about 1 dB).</summary>
    private const double TolerableAsymmetry = 0.06;

    /// <summary>Checks the interface FRFs of a part.</summary>
    /// <param name="dofs">Names of the first rows and columns of the matrix, which are the same dofs.</param>
    /// <param name="frf">Receptances; further rows and columns are ignored.</param>
    public static void Check(
        string part, SourceSpan? origin, FrequencyAxis axis, IReadOnlyList<DofCombination> dofs, TiledMatrix frf, DiagnosticBag diagnostics)
    {
        for (int i = 0; i < dofs.Count; i++)
        {
            CheckDrivingPoint(part, origin, axis, dofs[i], frf, i, diagnostics);
        }

        SayLeastReciprocal(part, origin, dofs, frf, diagnostics);
    }

    private static void CheckDrivingPoint(
        string part, SourceSpan? origin, FrequencyAxis axis, DofCombination dof, TiledMatrix frf, int i, DiagnosticBag diagnostics)
    {
        double generated = 0;
        double total = 0;
        List<double> activeHz = [];
        for (int line = 0; line < axis.Count; line++)
        {
            double power = axis.Omega(line) * frf[line, i, i].Imaginary;
            total += Math.Abs(power);
            if (power > 0)
            {
                generated += power;
                activeHz.Add(axis[line]);
            }
        }

        if (generated > TolerableShare * total)
        {
            diagnostics.Warning(
                EngineCodes.PowerGenerated,
                $"part `{part}`: the driving point `{dof}` generates power at {activeHz.Count} of {axis.Count} lines",
                origin,
                "check sign, axis and quantity of the FRF: a flipped sensor, conjugated FRFs, or accelerance taken for receptance look like this",
                $"at {FrequencyList.Of(activeHz)}");
        }
    }

    private static void SayLeastReciprocal(
        string part, SourceSpan? origin, IReadOnlyList<DofCombination> dofs, TiledMatrix frf, DiagnosticBag diagnostics)
    {
        var suspects = new List<(double Asymmetry, string Pair)>();
        for (int i = 0; i < dofs.Count; i++)
        {
            for (int j = 0; j < i; j++)
            {
                double asymmetry = Asymmetry(frf, i, j);
                if (asymmetry > TolerableAsymmetry)
                {
                    suspects.Add((asymmetry, string.Create(CultureInfo.InvariantCulture, $"`{dofs[i]}` and `{dofs[j]}` ({asymmetry:P0})")));
                }
            }
        }

        if (suspects.Count > 0)
        {
            diagnostics.Warning(
                EngineCodes.NotReciprocal,
                $"part `{part}`: {suspects.Count} pair{(suspects.Count == 1 ? "" : "s")} of interface FRFs {(suspects.Count == 1 ? "is" : "are")} not reciprocal",
                origin,
                "check position, direction and calibration of sensor and hammer at these dofs",
                $"largest asymmetry: {string.Join(", ", suspects.OrderByDescending(suspect => suspect.Asymmetry).Take(5).Select(suspect => suspect.Pair))}");
        }
    }

    /// <summary>Σ|Yᵢⱼ − Yⱼᵢ| / Σ(|Yᵢⱼ| + |Yⱼᵢ|) over all lines.</summary>
    private static double Asymmetry(TiledMatrix frf, int i, int j)
    {
        double difference = 0;
        double sum = 0;
        for (int tile = 0; tile < frf.TileCount; tile++)
        {
            ReadOnlySpan<double> a = frf.Entry(tile, i, j);
            ReadOnlySpan<double> b = frf.Entry(tile, j, i);
            for (int lane = 0; lane < Tiling.Lanes; lane++)
            {
                int imaginary = lane + Tiling.Lanes;
                difference += Length(a[lane] - b[lane], a[imaginary] - b[imaginary]);
                sum += Length(a[lane], a[imaginary]) + Length(b[lane], b[imaginary]);
            }
        }

        return sum > 0 ? difference / sum : 0;
    }

    private static double Length(double real, double imaginary) => Math.Sqrt(real * real + imaginary * imaginary);
}
