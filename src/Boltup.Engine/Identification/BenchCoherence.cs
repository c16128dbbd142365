using Boltup.Engine.Evidence;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Identification;

/// <summary>How much of the installed FRFs their excitation explains.</summary>
/// <param name="Values">γ² in the real parts, sensors × interface dofs.</param>
/// <param name="Averages">Number of averages behind every FRF.</param>
public sealed record BenchCoherence(TiledMatrix Values, int Averages, CoherenceReport Report);
