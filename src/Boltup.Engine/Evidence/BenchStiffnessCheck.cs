using System.Numerics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Evidence;

/// <summary>
/// Compares contact with blocked forces: from forces, or from the transfer matrix T of <see cref="ContactTransfer"/> alone, where blocked
/// forces of equal strength and without a common phase are taken. Common practice of the trade: a bench is stiff at low frequency only.
/// </summary>
public static class BenchStiffnessCheck
{
    /// <summary>|1 + Y_S/Y_R| up to which source and bench count as resonating together.</summary>
    private const double StrongCoupling = 0.5;

    /// <summary>From both forces, dof by dof in one order, at the same lines.</summary>
    public static BenchStiffness FromForces(SpectrumSet contact, SpectrumSet blocked)
    {
        SquareFrf.RequireLines(contact.Axis, blocked.Axis);
        if (contact.Dofs.Count != blocked.Dofs.Count)
        {
            throw new ArgumentException($"{contact.Dofs.Count} contact forces do not fit {blocked.Dofs.Count} blocked forces");
        }

        return Compare(contact, blocked, _ => []);
    }

    /// <summary>From T and the blocked forces of an operation.</summary>
    public static BenchStiffness FromTransfer(TiledMatrix transfer, SpectrumSet blocked) =>
        Compare(ContactTransfer.ContactForces(transfer, blocked), blocked, dof => MobilityRatio(transfer, dof));

    /// <summary>From T alone: a contact force for unit blocked forces at all dofs of its kind, added by power.</summary>
    /// <param name="dofs">Rows and columns of <paramref name="transfer"/>.</param>
    public static BenchStiffness FromTransfer(FrequencyAxis axis, IReadOnlyList<Dof> dofs, TiledMatrix transfer)
    {
        int[] counted = Counted(dofs);
        double[][] power = [.. dofs.Select((_, row) => Power(axis, transfer, row, LikeKind(dofs, row), unit: 0))];
        double[] contact = Sum(axis, counted.Select(row => power[row]));
        double[] difference = Sum(axis, counted.Select(row => Power(axis, transfer, row, counted, unit: 1)));
        return Report(
            axis,
            dofs,
            [.. power.Select(row => row.Select(ToDb).ToArray())],
            [.. contact.Select(sum => ToDb(sum / counted.Length))],
            [.. difference.Select(sum => Math.Sqrt(sum / counted.Length))],
            Math.Sqrt(difference.Sum() / counted.Length / axis.Count),
            dof => MobilityRatio(transfer, dof));
    }

    private static BenchStiffness Compare(SpectrumSet contact, SpectrumSet blocked, Func<int, Complex[]> mobilityRatio)
    {
        FrequencyAxis axis = blocked.Axis;
        int[] counted = Counted(blocked.Dofs);
        double[] reference = Sum(axis, counted.Select(dof => Squares(blocked.Values[dof])));
        double[] measured = Sum(axis, counted.Select(dof => Squares(contact.Values[dof])));
        double[] difference = Sum(axis, counted.Select(dof => SquaredDifferences(contact.Values[dof], blocked.Values[dof])));
        return Report(
            axis,
            blocked.Dofs,
            [.. blocked.Values.Select((values, dof) => Ratios(Squares(contact.Values[dof]), Squares(values)).Select(ToDb).ToArray())],
            [.. Ratios(measured, reference).Select(ToDb)],
            [.. Ratios(difference, reference).Select(Math.Sqrt)],
            Math.Sqrt(difference.Sum() / reference.Sum()),
            mobilityRatio);
    }

    private static BenchStiffness Report(
        FrequencyAxis axis,
        IReadOnlyList<Dof> dofs,
        double[][] ratioDb,
        double[] overallDb,
        double[] relativeDifference,
        double totalDifference,
        Func<int, Complex[]> mobilityRatio) => new(
            axis,
            [.. dofs.Select((dof, i) => Report(axis, dof, ratioDb[i], mobilityRatio(i)))],
            overallDb,
            relativeDifference,
            totalDifference,
            Agreement(axis, overallDb));

    private static BenchStiffnessDof Report(FrequencyAxis axis, Dof dof, double[] ratioDb, Complex[] mobilityRatio) => new(
        dof,
        ratioDb,
        mobilityRatio,
        mobilityRatio.Length == 0 ? [] : LineBand.Where(axis, line => Complex.Abs(1 + mobilityRatio[line]) <= StrongCoupling),
        Agreement(axis, ratioDb));

    private static AgreementLimit[] Agreement(FrequencyAxis axis, double[] ratioDb) =>
        [.. BenchStiffness.LimitsDb.Select(limit => AgreementLimit.Find(axis, ratioDb, limit))];

    private static Complex[] MobilityRatio(TiledMatrix transfer, int dof) =>
        [.. transfer.GatherSpectrum(dof, dof).Select(own => own / (1 - own))];

    /// <summary>The dofs that overall figures count: forces, or moments where there is no force.</summary>
    private static int[] Counted(IReadOnlyList<Dof> dofs)
    {
        int[] all = [.. Enumerable.Range(0, dofs.Count)];
        int[] forces = [.. all.Where(dof => dofs[dof].IsTranslation)];
        return forces.Length > 0 ? forces : all;
    }

    private static int[] LikeKind(IReadOnlyList<Dof> dofs, int row) =>
        [.. Enumerable.Range(0, dofs.Count).Where(column => dofs[column].IsTranslation == dofs[row].IsTranslation)];

    /// <summary>Per line Σ|T_ij − unit·δ_ij|² over the columns of a row.</summary>
    private static double[] Power(FrequencyAxis axis, TiledMatrix transfer, int row, int[] columns, double unit) =>
        Sum(axis, columns.Select(column =>
        {
            Complex[] entry = transfer.GatherSpectrum(row, column);
            return column == row && unit != 0 ? Squares([.. entry.Select(value => value - unit)]) : Squares(entry);
        }));

    private static double[] Sum(FrequencyAxis axis, IEnumerable<double[]> terms)
    {
        var sum = new double[axis.Count];
        foreach (double[] term in terms)
        {
            for (int line = 0; line < sum.Length; line++)
            {
                sum[line] += term[line];
            }
        }

        return sum;
    }

    private static double[] Squares(Complex[] values) => [.. values.Select(Square)];

    private static double[] SquaredDifferences(Complex[] a, Complex[] b) => [.. a.Zip(b, (x, y) => Square(x - y))];

    private static IEnumerable<double> Ratios(double[] measured, double[] reference) =>
        measured.Zip(reference, (a, b) => b > 0 ? a / b : double.NaN);

    private static double Square(Complex value) => value.Real * value.Real + value.Imaginary * value.Imaginary;

    private static double ToDb(double power) => 10 * Math.Log10(power);
}
