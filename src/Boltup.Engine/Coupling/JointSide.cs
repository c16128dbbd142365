namespace Boltup.Engine.Coupling;

/// <summary>At which end of a joint a constraint acts.</summary>
public enum JointSide
{
    /// <summary>At both: the joint passes on the force that it receives.</summary>
    Both,

    /// <summary>At the first point, of a mount with mass effect: the force that the first point exerts on the mount.</summary>
    First,

    /// <summary>At the second point, of a mount with mass effect: the force that the mount exerts on the second point.</summary>
    Second,
}
