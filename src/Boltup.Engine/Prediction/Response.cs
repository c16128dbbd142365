using Boltup.Engine.Acoustics;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Prediction;

/// <summary>A dof of the assembly that somebody cares about, in the axes of the assembly.</summary>
/// <param name="As">Displacement, velocity or acceleration for motion; pressure for a sound pressure.</param>
public sealed record Response(string Name, string Part, Dof Dof, Quantity As)
{
    public SourceSpan? Origin { get; init; }

    /// <summary>How people at the response feel its vibration; null where nobody said so.</summary>
    public FrequencyWeighting? Weighting { get; init; }

    /// <summary>SI unit of the response.</summary>
    public string Unit => As == Quantity.Pressure
        ? "Pa"
        : (Dof.IsRotation ? "rad" : "m") + As switch
        {
            Quantity.Velocity => "/s",
            Quantity.Acceleration => "/s²",
            _ => "",
        };
}
