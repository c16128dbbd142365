using System.Globalization;
using System.Numerics;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Identification;

/// <summary>Puts several runs of one operation together.</summary>
public static class RunAverage
{
    /// <summary>Agreement of phases below which the runs have none in common; 1 is full agreement, 0 what chance gives.</summary>
    private const double LeastAgreement = 0.5;

    /// <summary>The columns of an operation: the mean of phase-referenced runs, or each run as a column of its own, scaled by 1/√n.</summary>
    /// <param name="runs">At least two, with the same dofs and lines.</param>
    /// <returns>The columns, or null after an error in <paramref name="diagnostics"/>.</returns>
    public static IReadOnlyList<SpectrumSet>? Of(
        IReadOnlyList<SpectrumSet> runs, PhaseReference phase, string operation, SourceSpan? origin, DiagnosticBag diagnostics)
    {
        if (phase == PhaseReference.Free)
        {
            double share = 1 / Math.Sqrt(runs.Count);
            return [.. runs.Select(run => run with { Values = [.. run.Values.Select(values => Scaled(values, share))] })];
        }

        double agreement = Agreement(runs);
        if (agreement < LeastAgreement)
        {
            diagnostics.Error(
                EngineCodes.NoCommonPhase,
                $"operation `{operation}`: its {runs.Count} runs have no common phase",
                origin,
                "say `phase: free` to add them as cross-spectra",
                string.Create(CultureInfo.InvariantCulture, $"found: agreement of phases {agreement:F2}, expected at least {LeastAgreement} (1 is full, 0 is chance)"));
            return null;
        }

        return [Mean(runs)];
    }

    /// <summary>
    /// (n·A − 1)/(n − 1) with A = Σ|Σᵣuᵣ|²/(n·ΣΣᵣ|uᵣ|²) over all sensors and lines: 1 when all runs agree, near 0 for chance phases.
    /// </summary>
    public static double Agreement(IReadOnlyList<SpectrumSet> runs)
    {
        double together = 0, alone = 0;
        for (int dof = 0; dof < runs[0].Dofs.Count; dof++)
        {
            for (int line = 0; line < runs[0].Axis.Count; line++)
            {
                Complex sum = Complex.Zero;
                foreach (SpectrumSet run in runs)
                {
                    Complex value = run.Values[dof][line];
                    sum += value;
                    alone += value.Real * value.Real + value.Imaginary * value.Imaginary;
                }

                together += sum.Real * sum.Real + sum.Imaginary * sum.Imaginary;
            }
        }

        return alone > 0 ? (together / alone - 1) / (runs.Count - 1) : 1;
    }

    private static SpectrumSet Mean(IReadOnlyList<SpectrumSet> runs)
    {
        SpectrumSet first = runs[0];
        var means = new Complex[first.Dofs.Count][];
        for (int dof = 0; dof < means.Length; dof++)
        {
            means[dof] = new Complex[first.Axis.Count];
            for (int line = 0; line < means[dof].Length; line++)
            {
                means[dof][line] = runs.Aggregate(Complex.Zero, (sum, run) => sum + run.Values[dof][line]) / runs.Count;
            }
        }

        return first with { Values = means };
    }

    private static Complex[] Scaled(Complex[] values, double factor) => [.. values.Select(value => value * factor)];
}
