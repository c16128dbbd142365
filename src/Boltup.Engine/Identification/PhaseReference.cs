namespace Boltup.Engine.Identification;

/// <summary>Whether spectra of a source can be added with their phases.</summary>
public enum PhaseReference
{
    /// <summary>One phase reference for all: forces are spectra.</summary>
    Common,

    /// <summary>None: forces are a matrix of auto and cross spectra, G_ff.</summary>
    Free,
}
