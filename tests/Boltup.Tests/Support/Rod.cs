using System.Numerics;
using Boltup.Engine.Mounts;
using Boltup.Engine.Parts;
using Boltup.Engine.Spectra;

namespace Boltup.Tests.Support;

/// <summary>A uniform rod in longitudinal vibration, in closed form and as a chain of many small masses.</summary>
/// <param name="StiffnessNPerM">EA/L.</param>
/// <param name="MassKg">ρAL.</param>
internal sealed record Rod(double StiffnessNPerM, double MassKg, double LossFactor)
{
    /// <summary>
    /// Driving-point and transfer stiffness (any textbook on structure-borne sound): (EA/L)·βL·cot βL and −(EA/L)·βL/sin βL with
    /// (βL)² = ω²m/k, k complex.
    /// </summary>
    public (Complex Driving, Complex Transfer) Terms(double hz)
    {
        Complex stiffness = StiffnessNPerM * new Complex(1, LossFactor);
        Complex angle = 2 * Math.PI * hz * Complex.Sqrt(MassKg / stiffness);
        return (stiffness * angle / Complex.Tan(angle), -stiffness * angle / Complex.Sin(angle));
    }

    public TwoPortMount Mount(FrequencyAxis axis)
    {
        (Complex Driving, Complex Transfer)[] terms = [.. axis.Hz.ToArray().Select(Terms)];
        var driving = new StiffnessTable(Direction.X, axis, [.. terms.Select(term => term.Driving)]);
        var transfer = new StiffnessTable(Direction.X, axis, [.. terms.Select(term => term.Transfer)]);
        return new TwoPortMount([new TwoPortTable(driving, transfer, transfer, driving)]);
    }

    /// <summary>Equal pieces, half the mass of a piece at each of its ends; the ends are the masses 1 and pieces + 1.</summary>
    public PlacedPart Lumped(string name, int pieces)
    {
        double piece = MassKg / pieces;
        double[] masses = [.. Enumerable.Range(0, pieces + 1).Select(i => i == 0 || i == pieces ? piece / 2 : piece)];
        return Chain.Part(name, masses, [.. Enumerable.Repeat(StiffnessNPerM * pieces, pieces)], LossFactor);
    }
}
