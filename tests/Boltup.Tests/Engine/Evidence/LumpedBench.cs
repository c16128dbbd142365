using System.Numerics;
using Boltup.Engine.Coupling;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Mounts;
using Boltup.Engine.Parts;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;
using Boltup.Tests.Support;

namespace Boltup.Tests.Engine.Evidence;

/// <summary>
/// The chain of the coupling table: source A of 1 kg – k – 2 kg, receiver B of 3 kg – k2 – 4 kg – k3 – ground, joined at the 2 kg and
/// 3 kg masses, rigidly or through 1e6(1+0.05j) N/m; a unit force acts inside the source. Blocked forces in ten digits from the table,
/// whose numbers were recomputed independently in double precision.
/// </summary>
internal static class LumpedBench
{
    /// <summary>The table prints ten digits.</summary>
    public const double PrintedDigits = 1e-9;

    public static readonly FrequencyAxis Axis = FrequencyAxis.FromHertz([10, 30, 100]);
    public static readonly PlacedPart Source = Chain.Part("A", [1, 2], [1e5], 0.02);
    public static readonly PlacedPart Receiver = Chain.Part("B", [3, 4], [5e4], 0.02, (2, 2e5));
    public static readonly MountLaw Mount = Chain.Mount(1e6, 0.05);

    public static readonly Complex[] BlockedForce =
        [new(1.0410832090, -8.554354161e-4), new(1.5505930107, -1.708074852e-2), new(-0.3391695912, -9.085763077e-3)];

    /// <summary>Interface dof of the source, and of its chain the free end inside it.</summary>
    public static readonly Dof SourceInterface = Dof.Parse("2.x");
    public static readonly Dof SourceInside = Dof.Parse("1.x");

    /// <summary>Interface dof of the receiver, and its far mass.</summary>
    public static readonly Dof ReceiverInterface = Dof.Parse("1.x");
    public static readonly Dof ReceiverFar = Dof.Parse("2.x");

    /// <summary>Receptances of a part alone.</summary>
    public static FrfMatrix Frf(PlacedPart part, IReadOnlyList<Dof> rows, IReadOnlyList<Dof> columns, FrequencyAxis? axis = null) =>
        part.Model.Evaluate(axis ?? Axis, rows, columns, new DiagnosticBag())!;

    public static FrfMatrix Frf(PlacedPart part, Dof dof) => Frf(part, [dof], [dof]);

    /// <summary>What a unit force inside the source does to the assembly on a receiver.</summary>
    public static PredictionResult Run(Joint joint, params Response[] responses) => Chain.Predict(
        Axis, [Source, Receiver], [joint], [Chain.Force(ForceKind.Applied, Axis, Chain.End("A", 1), 1)], responses);

    public static Joint Rigid => Chain.Rigid(Chain.End("A", 2), Chain.End("B", 1));

    public static Joint Resilient => Chain.Through(Mount, Chain.End("A", 2), Chain.End("B", 1));

    public static SpectrumSet One(Dof dof, Complex[] values) => new(Axis, [dof], [values]);
}
