namespace Boltup.Engine.Acoustics;

/// <summary>A frequency weighting of sound (IEC 61672-1).</summary>
public enum FrequencyWeighting
{
    /// <summary>None: every line counts as it is.</summary>
    Z,

    /// <summary>A, after the sensitivity of hearing at low levels.</summary>
    A,

    /// <summary>C, nearly flat.</summary>
    C,
}
