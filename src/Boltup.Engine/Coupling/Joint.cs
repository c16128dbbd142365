using Boltup.Engine.Diagnostics;
using Boltup.Engine.Mounts;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Coupling;

/// <summary>A connection of two points in the axes of the assembly: rigid in some directions, or through a mount.</summary>
public sealed record Joint
{
    private Joint(string name, JointEnd first, JointEnd second, IReadOnlyList<Direction> directions, MountLaw? mount) =>
        (Name, First, Second, Directions, Mount) = (name, first, second, directions, mount);

    public string Name { get; }

    public JointEnd First { get; }

    public JointEnd Second { get; }

    /// <summary>The directions in which the points are connected.</summary>
    public IReadOnlyList<Direction> Directions { get; }

    /// <summary>The resilient element, or null for a rigid joint.</summary>
    public MountLaw? Mount { get; }

    public SourceSpan? Origin { get; init; }

    /// <summary>Both points move alike in these directions.</summary>
    public static Joint Rigid(string name, JointEnd first, JointEnd second, params IReadOnlyList<Direction> directions) =>
        new(name, first, second, directions, mount: null);

    /// <summary>The joint force is the mount's stiffness times the relative motion of the points.</summary>
    public static Joint Through(MountLaw mount, string name, JointEnd first, JointEnd second) =>
        new(name, first, second, mount.Directions, mount);
}
