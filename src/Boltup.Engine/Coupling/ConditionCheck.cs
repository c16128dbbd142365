using System.Globalization;
using System.Numerics;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Spectra;
using MathNet.Numerics.LinearAlgebra;

namespace Boltup.Engine.Coupling;

/// <summary>Judges the condition numbers of the interface problem, and names the joints that make it singular.</summary>
internal sealed class ConditionCheck(CouplingLayout layout, FrequencyAxis axis, IReadOnlyList<TiledMatrix?> frfs)
{
    /// <summary>Beyond this no digit of double precision is left: 1/(2·ε).</summary>
    public const double Singular = 0.5 / 2.220446049250313e-16;

    /// <summary>
    /// Beyond this a result of computed FRFs keeps fewer than five digits, and a measured one is long noise.
    /// </summary>
    private const double Doubtful = 1e11;

    /// <summary>Share of the largest component from which a constraint counts as part of a singular motion.</summary>
    private const double Involved = 0.3;

    /// <returns>False after an error in <paramref name="diagnostics"/>.</returns>
    public bool Check(double[] condition, DiagnosticBag diagnostics)
    {
        if (layout.Constraints.Count == 0)
        {
            return true;
        }

        double[] singularHz = Where(condition, value => !(value < Singular));
        if (singularHz.Length > 0)
        {
            diagnostics.Add(SayIsSingular(singularHz));
            return false;
        }

        double[] doubtfulHz = Where(condition, value => value > Doubtful);
        if (doubtfulHz.Length > 0)
        {
            diagnostics.Warning(
                EngineCodes.IllConditionedInterface,
                $"the interface problem is badly conditioned at {FrequencyList.Of(doubtfulHz)}",
                notes: [string.Create(CultureInfo.InvariantCulture, $"largest condition number: {condition.Max():E1}")]);
        }

        return true;
    }

    private double[] Where(double[] condition, Func<double, bool> test) =>
        [.. Enumerable.Range(0, condition.Length).Where(line => test(condition[line])).Select(line => axis[line])];

    private Diagnostic SayIsSingular(double[] singularHz)
    {
        Constraint[] involved = InvolvedAt(axis.IndexOf(singularHz[0]));
        return new Diagnostic(
            EngineCodes.SingularInterface,
            Severity.Error,
            $"the joints do not determine the joint forces at {FrequencyList.Of(singularHz)} ({singularHz.Length} of {axis.Count} lines)")
        {
            Span = involved.Select(constraint => constraint.Joint.Origin).FirstOrDefault(origin => origin is not null),
            Notes = [$"involved: {string.Join(", ", involved.Select(constraint => $"`{constraint}`"))}"],
            Helps = ["the same motion is constrained twice, or a part cannot move there: remove or soften one of the joints involved"],
        };
    }

    /// <summary>The constraints that take part in the motion that is constrained twice: the last right singular vector.</summary>
    private Constraint[] InvolvedAt(int line)
    {
        DenseAlgebra.PickUpProvider();
        int order = layout.Constraints.Count;
        var tile = new TiledMatrix(Tiling.Lanes, order, order);
        new InterfaceMatrix(layout, axis, frfs).Fill(line / Tiling.Lanes, tile.Tile(0));
        var matrix = Matrix<Complex>.Build.Dense(order, order, (i, j) => tile[line % Tiling.Lanes, i, j]);
        if (matrix.Enumerate().Any(value => !Complex.IsFinite(value)))
        {
            return [.. layout.Constraints.Where((_, i) => matrix.Row(i).Any(value => !Complex.IsFinite(value)))];
        }

        double[] share = [.. matrix.Svd().VT.Row(order - 1).Select(Complex.Abs)];
        return [.. layout.Constraints.Where((_, i) => share[i] > Involved * share.Max())];
    }
}
