using Boltup.Engine.Acoustics;

namespace Boltup.Engine.Paths;

/// <summary>What must drop, and by how much, for a response to keep its limits.</summary>
/// <param name="Joints">Per path of <see cref="PathView.Joints"/>, in the order of the assembly.</param>
/// <param name="Forces">Per force of the operation.</param>
/// <param name="AllForcesChange">
/// The change of all forces of the operation by the same number of dB that just meets the limits: below zero where a limit is missed, otherwise
/// what is to spare.
/// </param>
/// <param name="UniformForceLevel">
/// The largest flat uniform force level in dB re 1 N per third octave that meets the limits: every force of the operation has this rms value in
/// every third octave, spread evenly over the frequencies of the band, and no two forces have a common phase, so that their powers add at the
/// response. Moments count with the same number in N·m. In a third octave that the lines fill only in part, the band's whole force is taken
/// to act in that part. Infinite where no force reaches the response.
/// </param>
public sealed record RequiredReduction(
    IReadOnlyList<PathReduction> Joints, IReadOnlyList<PathReduction> Forces, double AllForcesChange, double UniformForceLevel)
{
    /// <summary>Relative excess of a limit that rounding explains.</summary>
    private const double Rounding = 1e-12;

    /// <param name="response">Place of the response in the assembly.</param>
    /// <param name="limits">At least one.</param>
    public static RequiredReduction Of(OperationPaths paths, int response, IReadOnlyList<PathLimit> limits)
    {
        PathSpectra forces = paths.Of(response, PathView.Forces);
        double[] totals = [.. limits.Select(limit => forces.TotalPower(limit.Lines))];
        return new RequiredReduction(
            Alone(paths.Of(response, PathView.Joints), limits),
            Alone(forces, limits),
            limits.Select((limit, i) => Decibels(limit.Power / totals[i])).Min(),
            Decibels(UniformPower(paths, response, limits)));
    }

    private static PathReduction[] Alone(PathSpectra spectra, IReadOnlyList<PathLimit> limits)
    {
        double[] totals = [.. limits.Select(limit => spectra.TotalPower(limit.Lines))];
        return [.. spectra.Paths.Select((path, i) => new PathReduction(path, Alone(spectra, i, limits, totals)))];
    }

    /// <summary>
    /// With the contribution times s the power is total − 2(1 − s)·part + (1 − s)²·own, a parabola in the drop 1 − s: each limit
    /// leaves an interval of drops, and the smallest one that all intervals share is wanted.
    /// </summary>
    private static double? Alone(PathSpectra spectra, int path, IReadOnlyList<PathLimit> limits, double[] totals)
    {
        (double least, double most) = (0, 1);
        for (int i = 0; i < totals.Length; i++)
        {
            (double from, double to) = Drops(
                totals[i] - limits[i].Power * (1 + Rounding), spectra.PowerOf(path, limits[i].Lines), spectra.PartOf(path, limits[i].Lines));
            (least, most) = (Math.Max(least, from), Math.Min(most, to));
        }

        // No comparison holds for the NaN of a limit that no drop can meet.
        return least <= most ? -20 * Math.Log10(1 - least) + 0.0 : null;
    }

    /// <summary>The drops d with own·d² − 2·part·d + excess ≤ 0.</summary>
    private static (double From, double To) Drops(double excess, double own, double part)
    {
        if (own <= 0)
        {
            return excess <= 0 ? (0, 1) : (double.NaN, double.NaN);
        }

        double root = Math.Sqrt(part * part - own * excess);

        // Of two roots the larger one is computed, the other follows from their product: no digits cancel.
        double larger = (part + Math.CopySign(root, part)) / own;
        double other = larger == 0 ? 0 : excess / own / larger;
        return (Math.Min(larger, other), Math.Max(larger, other));
    }

    /// <summary>Largest mean square force per third octave.</summary>
    private static double UniformPower(OperationPaths paths, int response, IReadOnlyList<PathLimit> limits)
    {
        var sums = new BandSums(paths.Axis);
        double[] widths = [.. Enumerable.Range(0, paths.Axis.Count).Select(sums.CellWidthHz)];
        double[] squares = [.. widths.Select((width, line) => width * paths.SquaredTransfers(response, line))];
        return limits.Min(limit =>
        {
            double[] limited = [.. squares.Select((square, line) => square * limit.Lines.FactorAt(line))];
            return limit.Power / sums.Bands.Select((_, band) => Mean(sums, band, limited, widths)).Sum();
        });
    }

    /// <summary>Mean over the frequencies of a band that the lines fill.</summary>
    private static double Mean(BandSums sums, int band, double[] values, double[] widths)
    {
        double width = sums.Sum(band, widths);
        return width > 0 ? sums.Sum(band, values) / width : 0;
    }

    private static double Decibels(double powerRatio) => 10 * Math.Log10(powerRatio);
}
