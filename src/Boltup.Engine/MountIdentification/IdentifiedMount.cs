using Boltup.Engine.Prediction;

namespace Boltup.Engine.MountIdentification;

/// <summary>What an installation says about one of its mounts.</summary>
/// <param name="Stiffness">Transfer stiffness per direction, named by the ends.</param>
/// <param name="Evidence">One entry per direction.</param>
public sealed record IdentifiedMount(MountEnds Ends, MountSpectrum Stiffness, IReadOnlyList<MountEvidence> Evidence);
