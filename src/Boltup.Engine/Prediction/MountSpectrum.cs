using System.Numerics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Prediction;

/// <summary>The dynamic stiffness of one mount over the lines of a prediction.</summary>
/// <param name="Name">Name of the mount, or of the joint where the mount has none.</param>
/// <param name="Terms">Direction by direction; of a mount that couples directions those on the diagonal.</param>
public sealed record MountSpectrum(string Name, IReadOnlyList<MountTerm> Terms);

/// <summary>One stiffness of a mount.</summary>
/// <param name="Name">Empty for the one stiffness of a direction; <c>k11</c>, <c>−k21</c> or <c>k22</c> of a mount with mass effect.</param>
/// <param name="Values">One value per line, N/m or N·m/rad.</param>
public sealed record MountTerm(Direction Direction, string Name, IReadOnlyList<Complex> Values);
