using System.Numerics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Mounts;

/// <summary>Complex dynamic stiffness of one direction over frequency.</summary>
/// <param name="Axis">Lines of the table.</param>
/// <param name="Stiffness">One value per line, N/m or N·m/rad.</param>
public sealed record StiffnessTable(Direction Direction, FrequencyAxis Axis, IReadOnlyList<Complex> Stiffness)
{
    /// <summary>The stiffness at a frequency, linear in real and imaginary parts between the lines.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The frequency is outside the band of the table.</exception>
    public Complex At(double hz)
    {
        int same = Axis.IndexOf(hz);
        if (same >= 0)
        {
            return Stiffness[same];
        }

        int above = ~Axis.Hz.BinarySearch(hz);
        if (above <= 0 || above >= Axis.Count)
        {
            throw new ArgumentOutOfRangeException(nameof(hz), hz, "outside the band of the stiffness table");
        }

        double share = (hz - Axis[above - 1]) / (Axis[above] - Axis[above - 1]);
        return (1 - share) * Stiffness[above - 1] + share * Stiffness[above];
    }
}
