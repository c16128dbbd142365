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

    /// <summary>Name of the mount in the document, where it has one.</summary>
    public string? MountName { get; init; }

    /// <summary>The rows of B that the joint makes; of a mount with mass effect those of the first end come first.</summary>
    public IEnumerable<Constraint> Constraints => Mount is { IsTwoPort: true }
        ? [.. Of(JointSide.First), .. Of(JointSide.Second)]
        : Of(JointSide.Both);

    /// <summary>Number of rows of B that the joint makes.</summary>
    public int Order => Mount?.Order ?? Directions.Count;

    public SourceSpan? Origin { get; init; }

    /// <summary>Both points move alike in these directions.</summary>
    public static Joint Rigid(string name, JointEnd first, JointEnd second, params IReadOnlyList<Direction> directions) =>
        new(name, first, second, directions, mount: null);

    /// <summary>
    /// The joint force is the mount's stiffness times the relative motion of the points; where the mount has mass effect, the forces at its
    /// two ends are its stiffness times the motion of both points.
    /// </summary>
    public static Joint Through(MountLaw mount, string name, JointEnd first, JointEnd second) =>
        new(name, first, second, mount.Directions, mount);

    private IEnumerable<Constraint> Of(JointSide side) => Directions.Select(direction => new Constraint(this, direction, side));
}
