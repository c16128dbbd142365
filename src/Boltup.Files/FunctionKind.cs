namespace Boltup.Files;

/// <summary>What a function in a data file is.</summary>
public enum FunctionKind
{
    General,
    Frf,
    Spectrum,
    AutoSpectrum,
    CrossSpectrum,
    PowerSpectralDensity,
    Coherence,
    Transmissibility,
    Order,

    /// <summary>Complex dynamic stiffness of a mount in one direction.</summary>
    MountStiffness,

    /// <summary>Anything that this version does not use.</summary>
    Other,
}
