using Boltup.Engine.Spectra;

namespace Boltup.Engine.Parts;

/// <summary>One of a part's own dofs with its direction cosine.</summary>
public readonly record struct DofTerm(Dof Dof, double Cosine);
