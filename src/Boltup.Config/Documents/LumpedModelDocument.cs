using Boltup.Config.Binding;
using Boltup.Engine.Spectra;

namespace Boltup.Config.Documents;

/// <summary>A part given by masses and links that move along one direction.</summary>
public sealed record LumpedModelDocument(
    Marked<Direction> Direction, IReadOnlyList<LumpedMassDocument> Masses, IReadOnlyList<LumpedLinkDocument> Links) : PartModelDocument;

/// <summary>A mass in kg, which is a point with one dof.</summary>
public sealed record LumpedMassDocument(Marked<string> Point, Marked<double> MassKg);

/// <summary>A spring and damper between two masses, or between a mass and <c>ground</c>.</summary>
/// <param name="First">Name of a mass, or null for ground.</param>
/// <param name="Second">Name of a mass, or null for ground; never both null.</param>
/// <param name="StiffnessNPerM">Stiffness in N/m, zero when not given.</param>
/// <param name="LossFactor">Factor η of the complex stiffness k(1 + jη), zero when not given.</param>
/// <param name="DampingNsPerM">Viscous damping in N·s/m, zero when not given.</param>
public sealed record LumpedLinkDocument(
    Marked<string?> First, Marked<string?> Second, double StiffnessNPerM, double LossFactor, double DampingNsPerM);
