using System.Numerics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Identification;

/// <summary>How far repeated runs are apart.</summary>
public static class RunScatter
{
    /// <summary>
    /// Standard deviation of the magnitudes over runs, n − 1 in the denominator (JCGM 100, 4.2.2), as a real spectrum: the spread of one
    /// run, in the unit of the runs.
    /// </summary>
    /// <param name="runs">At least two, with the same dofs and lines.</param>
    public static SpectrumSet Of(IReadOnlyList<SpectrumSet> runs)
    {
        SpectrumSet first = runs[0];
        return first with { Values = [.. Enumerable.Range(0, first.Dofs.Count).Select(dof => OfDof(runs, dof))] };
    }

    private static Complex[] OfDof(IReadOnlyList<SpectrumSet> runs, int dof)
    {
        var scatter = new Complex[runs[0].Axis.Count];
        for (int line = 0; line < scatter.Length; line++)
        {
            double mean = runs.Average(run => run.Values[dof][line].Magnitude);
            double squares = runs.Sum(run => Math.Pow(run.Values[dof][line].Magnitude - mean, 2));
            scatter[line] = Math.Sqrt(squares / (runs.Count - 1));
        }

        return scatter;
    }
}
