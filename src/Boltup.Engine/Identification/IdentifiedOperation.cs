using System.Numerics;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Identification;

/// <summary>Blocked forces of one operation and what they say at sensors that took no part.</summary>
/// <param name="Forces">One set for each column of the operation, N and N·m over the interface dofs; powers of columns add.</param>
/// <param name="Lines">What the inversion did at each line.</param>
/// <param name="Predicted">For each column the motion (m) or pressure (Pa) at the validation sensors that the forces predict.</param>
/// <param name="Measured">For each column what the validation sensors measured.</param>
/// <param name="Scatter">Standard deviation of the force magnitudes of single runs, per interface dof and line; null for one run.</param>
public sealed record IdentifiedOperation(
    string Name,
    Amplitude Amplitude,
    PhaseReference Phase,
    bool IsDensity,
    IReadOnlyList<SpectrumSet> Forces,
    IReadOnlyList<LineChoice> Lines,
    IReadOnlyList<SpectrumSet> Predicted,
    IReadOnlyList<SpectrumSet> Measured,
    SpectrumSet? Scatter)
{
    /// <summary>G_ff of a pair of interface dofs at a line: Σ fᵢ·conj(fⱼ) over the columns.</summary>
    public Complex CrossSpectrum(int row, int column, int line)
    {
        Complex sum = Complex.Zero;
        foreach (SpectrumSet set in Forces)
        {
            sum += set.Values[row][line] * Complex.Conjugate(set.Values[column][line]);
        }

        return sum;
    }

    /// <summary>Root of the summed powers of all columns at each line: the magnitude of a spectrum where there is one column.</summary>
    public double[] Magnitudes(int dof) => MagnitudesOf(Forces, dof);

    /// <summary>Root of the summed powers of all columns of some spectra at each line.</summary>
    public static double[] MagnitudesOf(IReadOnlyList<SpectrumSet> columns, int dof)
    {
        double[] power = new double[columns[0].Axis.Count];
        foreach (SpectrumSet set in columns)
        {
            for (int line = 0; line < power.Length; line++)
            {
                Complex value = set.Values[dof][line];
                power[line] += value.Real * value.Real + value.Imaginary * value.Imaginary;
            }
        }

        return [.. power.Select(Math.Sqrt)];
    }
}
