namespace Boltup.Engine.Parts;

/// <summary>Two FRFs that should be equal (Maxwell–Betti, Rayleigh).</summary>
/// <param name="First">Name of a dof.</param>
/// <param name="Second">Name of the other.</param>
/// <param name="Asymmetry">Σ|Yᵢⱼ − Yⱼᵢ| / Σ(|Yᵢⱼ| + |Yⱼᵢ|) over all lines: 0 for equal FRFs, 1 for opposite ones.</param>
public sealed record ReciprocityPair(string First, string Second, double Asymmetry);
