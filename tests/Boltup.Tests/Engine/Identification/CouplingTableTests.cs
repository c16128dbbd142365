using System.Numerics;
using Boltup.Engine.Coupling;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Identification;
using Boltup.Engine.Parts;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;
using Boltup.Tests.Support;

namespace Boltup.Tests.Engine.Identification;

/// <summary>
/// The coupling table turned round: A is 1 kg – k – 2 kg, B is 3 kg – k2 – 4 kg – k3 – ground, joined rigidly; a unit force on the 1 kg mass
/// moves the joined and the 4 kg mass, and the blocked force follows from that motion and the interface FRFs of the coupled system
/// (recomputed values of a textbook chain, printed to ten digits).
/// </summary>
public class CouplingTableTests
{
    private const double PrintedDigits = 1e-9;

    [Theory]
    [InlineData(10, 1.0410832090, -8.554354161e-4)]
    [InlineData(30, 1.5505930107, -1.708074852e-2)]
    [InlineData(100, -0.3391695912, -9.085763077e-3)]
    public void Run_MotionOfTheCoupledChain_GivesThePrintedBlockedForce(double hz, double real, double imaginary)
    {
        FrequencyAxis axis = FrequencyAxis.FromHertz([hz]);
        Dof[] sensors = [Dof.Parse("joined.x"), Dof.Parse("end.x")];
        var installed = new MeasuredCoupling(axis, sensors, Motion(axis, Chain.End("B", 1)));
        var running = new SpectrumSet(axis, sensors, [.. Motion(axis, Chain.End("A", 1)).Select(value => new[] { value })]);
        var bench = new BenchModel(
            "chain", axis, installed, [Dof.Parse("m.x")], sensors, [], [RandomBench.Operation("run", running)], SolveChoice.Plain);

        IdentificationResult result = Identifier.Run(bench, new DiagnosticBag())!;

        Near.Equal(new Complex(real, imaginary), result.Operations[0].Forces[0].Values[0][0], PrintedDigits);
    }

    /// <summary>Receptances at the joined and the 4 kg mass for a unit force; the joined masses are excited on B's side.</summary>
    private static Complex[] Motion(FrequencyAxis axis, JointEnd force)
    {
        PlacedPart a = Chain.Part("A", [1, 2], [1e5], 0.02), b = Chain.Part("B", [3, 4], [5e4], 0.02, ground: (2, 2e5));
        PredictionResult result = Chain.Predict(
            axis,
            [a, b],
            [Chain.Rigid(Chain.End("A", 2), Chain.End("B", 1))],
            [Chain.Force(ForceKind.Applied, axis, force, Complex.One)],
            Chain.At(Chain.End("B", 1), "joined"),
            Chain.At(Chain.End("B", 2), "end"));
        return [.. result.Operations[0].Responses.Select(response => response.Values[0])];
    }

    /// <summary>FRFs from the interface: the motion at both sensors for a force at the joined mass.</summary>
    private sealed class MeasuredCoupling(FrequencyAxis axis, Dof[] sensors, Complex[] motion) : IPartModel
    {
        public FrequencyAxis Axis => axis;

        public IReadOnlyCollection<Dof> Responses => sensors;

        public IReadOnlyCollection<Dof> Excitations { get; } = [Dof.Parse("m.x")];

        public bool HasFrf(Dof response, Dof excitation) => sensors.Contains(response);

        public FrfMatrix Evaluate(FrequencyAxis lines, IReadOnlyList<Dof> rows, IReadOnlyList<Dof> columns, DiagnosticBag diagnostics)
        {
            var frf = new FrfMatrix(lines, rows, columns);
            for (int row = 0; row < rows.Count; row++)
            {
                frf.Values.ScatterSpectrum(row, 0, [motion[Array.IndexOf(sensors, rows[row])]]);
            }

            return frf;
        }
    }
}
