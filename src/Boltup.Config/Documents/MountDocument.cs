using Boltup.Config.Binding;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Mounts;
using Boltup.Engine.Spectra;

namespace Boltup.Config.Documents;

/// <summary>A resilient element and its law.</summary>
public sealed record MountDocument(Marked<string> Name, MountLawDocument Law);

/// <summary>How a mount resists relative motion; in the axes of the assembly.</summary>
public abstract record MountLawDocument
{
    /// <summary>The mounts that the law names.</summary>
    public virtual IReadOnlyList<Marked<string>> Others => [];
}

/// <summary>Stiffness and damping per direction: k(1 + jη) + jωc.</summary>
/// <param name="Stiffness">N/m, or N·m/rad for rotations; a direction that is not listed is free.</param>
/// <param name="LossFactor">η of all directions, zero when not given.</param>
/// <param name="Damping">c in N·s/m, or N·m·s/rad for rotations.</param>
public sealed record DirectionalLawDocument(
    IReadOnlyDictionary<Direction, Marked<double>> Stiffness,
    double LossFactor,
    IReadOnlyDictionary<Direction, Marked<double>> Damping) : MountLawDocument;

/// <summary>A full symmetric stiffness matrix K(1 + jη) with viscous damping per direction on its diagonal.</summary>
/// <param name="Stiffness">3×3 over x, y, z or 6×6 over x, y, z, rx, ry, rz; row is force, column is displacement, SI units.</param>
public sealed record MatrixLawDocument(
    Marked<double[,]> Stiffness,
    double LossFactor,
    IReadOnlyDictionary<Direction, Marked<double>> Damping) : MountLawDocument;

/// <summary>A static stiffness that rises with frequency as its material relaxes: Zener and fractional Zener laws.</summary>
public sealed record RelaxingLawDocument(MountLawDocument AtRest, Relaxation Relaxation) : MountLawDocument;

/// <summary>Other mounts together: side by side, or one behind the other in the order of a joint's points.</summary>
public sealed record ComposedLawDocument(IReadOnlyList<Marked<string>> Mounts, bool IsSeries, SourceSpan Span) : MountLawDocument
{
    public override IReadOnlyList<Marked<string>> Others => Mounts;
}

/// <summary>The law of another mount, scaled.</summary>
public sealed record LikeLawDocument(Marked<string> Mount, double Scale) : MountLawDocument
{
    public override IReadOnlyList<Marked<string>> Others => [Mount];
}

/// <summary>A complex dynamic stiffness over frequency from a file.</summary>
/// <param name="At">Which of the tables of the file, where it holds several; null where it holds one.</param>
public sealed record TableLawDocument(FileReference File, Marked<string>? At) : MountLawDocument;
