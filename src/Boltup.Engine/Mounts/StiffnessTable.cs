using System.Numerics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Mounts;

/// <summary>Complex dynamic stiffness of one direction over frequency.</summary>
/// <param name="Axis">Lines of the table.</param>
/// <param name="Stiffness">One value per line, N/m or N·m/rad.</param>
public sealed record StiffnessTable(Direction Direction, FrequencyAxis Axis, IReadOnlyList<Complex> Stiffness);
