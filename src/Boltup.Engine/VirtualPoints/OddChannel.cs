using Boltup.Engine.Spectra;

namespace Boltup.Engine.VirtualPoints;

/// <summary>The channel of a virtual point that disagrees most with all the others.</summary>
/// <param name="Dof">The dof of the data.</param>
/// <param name="Consistency">As in <see cref="VirtualPointQuality.Channels"/>, but with the motion that the other channels alone predict.</param>
/// <param name="Share">Share of the squared misfit of all channels that goes when this one is left out: 1 for a single fault in exact data.</param>
public sealed record OddChannel(Dof Dof, double Consistency, double Share);
