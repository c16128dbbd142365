using Boltup.Engine.Geometry;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.VirtualPoints;

/// <summary>One direction of a sensor, or one impact, near an interface.</summary>
/// <param name="Dof">The dof of the data.</param>
/// <param name="At">Position in m, in the axes of the part.</param>
/// <param name="Along">Unit vector of the direction, in the axes of the part.</param>
/// <param name="Weight">How much it counts in the fit; positive.</param>
public sealed record MeasuredChannel(Dof Dof, Vector3d At, Vector3d Along, double Weight);
