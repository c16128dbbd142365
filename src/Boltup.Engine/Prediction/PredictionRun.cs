using Boltup.Engine.Coupling;
using Boltup.Engine.Paths;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Prediction;

/// <summary>A coupling with everything that it was made from, for what is worked out of it afterwards.</summary>
/// <param name="Frfs">For each part of the layout its FRFs, null for a part that is not used.</param>
/// <param name="ResponseRows">For each response of the assembly its row among the responses of its part.</param>
/// <param name="Transfers">With the adjoints of the responses.</param>
internal sealed record PredictionRun(
    AssemblyModel Assembly,
    CouplingLayout Layout,
    ForceCases Cases,
    IReadOnlyList<TiledMatrix?> Frfs,
    int[] ResponseRows,
    CouplingSolution Solution,
    PathTransfers Transfers);
