using Boltup.Engine.Diagnostics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Prediction;

/// <summary>A dof of the assembly that somebody cares about, in the axes of the assembly.</summary>
/// <param name="As">Displacement, velocity or acceleration for motion; pressure for a sound pressure.</param>
public sealed record Response(string Name, string Part, Dof Dof, Quantity As)
{
    public SourceSpan? Origin { get; init; }

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
