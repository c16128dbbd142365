namespace Boltup.Engine.Evidence;

/// <summary>What a channel of the operation looks like beside what the installed FRFs and all other channels say.</summary>
public enum ChannelFault
{
    /// <summary>The opposite sign: a sensor or axis turned round between the two measurements.</summary>
    Flipped,

    /// <summary>A factor of 9.80665 either way: g taken for m/s². The sign may be turned round as well.</summary>
    InG,

    /// <summary>Another constant factor: sensitivity, gain or unit.</summary>
    Scaled,

    /// <summary>Exchanged with another channel.</summary>
    Swapped,

    /// <summary>No constant factor fits: another sensor, a loose cable, a dead channel.</summary>
    Unrelated,
}
