namespace Boltup.Engine.Acoustics;

/// <summary>A frequency weighting of sound (IEC 61672-1) or of vibration that acts on people (ISO 2631-1, ISO 5349-1).</summary>
public enum FrequencyWeighting
{
    /// <summary>None: every line counts as it is.</summary>
    Z,

    /// <summary>A, after the sensitivity of hearing at low levels.</summary>
    A,

    /// <summary>C, nearly flat.</summary>
    C,

    /// <summary>Vertical vibration of a seated or standing body.</summary>
    Wk,

    /// <summary>Horizontal vibration of a seated or standing body.</summary>
    Wd,

    /// <summary>Vibration of hands and arms.</summary>
    Wh,
}
