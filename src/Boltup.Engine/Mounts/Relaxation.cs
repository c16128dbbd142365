using System.Numerics;

namespace Boltup.Engine.Mounts;

/// <summary>
/// How a stiffness rises with frequency while the material relaxes: (1 + d(jωτ)^α) / (1 + (jωτ)^α) times its static value. Order 1 is the
/// Zener model (standard linear solid); a lower one the fractional Zener model of Bagley and Torvik (J. Rheology 27 (1983) 201) with the
/// notation of Pritz (J. Sound Vib. 195 (1996) 103), both from memory. Causal and passive for d ≥ 1, 0 &lt; α ≤ 1.
/// </summary>
/// <param name="Stiffening">d, stiffness at high over that at low frequency; at least 1.</param>
/// <param name="TimeS">τ in s.</param>
/// <param name="Order">α, more than 0 and at most 1.</param>
public readonly record struct Relaxation(double Stiffening, double TimeS, double Order)
{
    /// <summary>Factor on the static stiffness.</summary>
    /// <param name="omega">Angular frequency in rad/s.</param>
    public Complex FactorAt(double omega)
    {
        var power = Complex.FromPolarCoordinates(Math.Pow(omega * TimeS, Order), Order * Math.PI / 2);
        return (1 + Stiffening * power) / (1 + power);
    }
}
