namespace Boltup.Engine.Spectra;

/// <summary>What a dof moves along, or what it is the sound of. The order is the order of columns and reports.</summary>
public enum Direction
{
    X,
    Y,
    Z,
    RX,
    RY,
    RZ,

    /// <summary>Sound pressure.</summary>
    P,

    /// <summary>Volume velocity.</summary>
    Q,
}
