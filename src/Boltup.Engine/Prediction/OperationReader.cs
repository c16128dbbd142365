using System.Numerics;
using Boltup.Engine.Coupling;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Prediction;

/// <summary>Reads the spectra of one operation out of the solution.</summary>
/// <param name="responseRows">For each response of the assembly its row among the responses of its part.</param>
internal sealed class OperationReader(AssemblyModel assembly, CouplingLayout layout, CouplingSolution solution, int[] responseRows)
{
    public OperationResult Read(Operation operation, Range cases)
    {
        FrequencyAxis axis = operation.Forces.Aggregate(assembly.Axis, (shared, set) => shared.SharedWith(set.Axis)!);
        int[] lines = [.. axis.Hz.ToArray().Select(assembly.Axis.IndexOf)];
        return new OperationResult(
            operation.Name,
            axis,
            operation.Amplitude,
            [.. assembly.Responses.Select((response, i) => ReadResponse(response, responseRows[i], cases, lines))],
            [.. layout.Constraints.Select((constraint, row) => ReadJointForce(constraint, row, cases, lines))]);
    }

    private ResponseSpectrum ReadResponse(Response response, int row, Range cases, int[] lines)
    {
        TiledMatrix? values = solution.Responses[IndexOf(response.Part)];
        int order = FrfQuantity.DerivativeOrder(response.As);
        Complex[] spectrum = Spectrum(values, row, cases, lines);
        for (int i = 0; i < lines.Length; i++)
        {
            spectrum[i] *= Derivative(order, assembly.Axis.Omega(lines[i]), keepPhase: IsOneCase(cases));
        }

        return new ResponseSpectrum(response.Name, $"{response.Part}.{response.Dof}", response.As, response.Unit, spectrum) { Weighting = response.Weighting };
    }

    private JointForceSpectrum ReadJointForce(Constraint constraint, int row, Range cases, int[] lines) => new(
        constraint.JointName,
        constraint.Direction,
        constraint.Direction >= Direction.RX ? "N·m" : "N",
        Spectrum(solution.JointForces, row, cases, lines));

    private int IndexOf(string part) => layout.Parts.TakeWhile(candidate => candidate.Part.Name != part).Count();

    private bool IsOneCase(Range cases) => Length(cases) == 1;

    private int Length(Range cases) => cases.GetOffsetAndLength(solution.JointForces.Columns).Length;

    /// <summary>(jω)^order; its magnitude where there is no phase to keep.</summary>
    private static Complex Derivative(int order, double omega, bool keepPhase) => (order, keepPhase) switch
    {
        (0, _) => Complex.One,
        (1, true) => new Complex(0, omega),
        (1, false) => omega,
        (_, true) => -omega * omega,
        _ => omega * omega,
    };

    /// <summary>The one case as it is, or the root of the summed powers of several.</summary>
    private static Complex[] Spectrum(TiledMatrix? values, int row, Range cases, int[] lines)
    {
        var spectrum = new Complex[lines.Length];
        if (values is null)
        {
            return spectrum;
        }

        (int first, int count) = cases.GetOffsetAndLength(values.Columns);
        for (int i = 0; i < lines.Length; i++)
        {
            spectrum[i] = count == 1 ? values[lines[i], row, first] : EnergySum(values, lines[i], row, first, count);
        }

        return spectrum;
    }

    private static double EnergySum(TiledMatrix values, int line, int row, int first, int count)
    {
        double sum = 0;
        for (int column = first; column < first + count; column++)
        {
            Complex value = values[line, row, column];
            sum += value.Real * value.Real + value.Imaginary * value.Imaginary;
        }

        return Math.Sqrt(sum);
    }
}
