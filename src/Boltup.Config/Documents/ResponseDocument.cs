using Boltup.Config.Binding;
using Boltup.Engine.Acoustics;
using Boltup.Engine.Spectra;

namespace Boltup.Config.Documents;

/// <summary>A dof of the assembly that somebody cares about.</summary>
/// <param name="As">The quantity asked for: acceleration, velocity or displacement; null for sound pressure and for the default.</param>
public sealed record ResponseDocument(Marked<string> Name, Marked<AssemblyDof> At, Marked<Quantity>? As)
{
    /// <summary>How people feel its vibration; null where nobody says so.</summary>
    public Marked<FrequencyWeighting>? Weighting { get; init; }

    /// <summary>The quantity to report: pressure at <c>p</c>, otherwise what was asked for, by default acceleration.</summary>
    public Quantity Quantity => At.Value.Dof.Direction == Direction.P ? Quantity.Pressure : As?.Value ?? Quantity.Acceleration;
}

/// <summary>A dof of a part of an assembly, written <c>part.point.direction</c>.</summary>
public readonly record struct AssemblyDof(string Part, Dof Dof)
{
    public override string ToString() => $"{Part}.{Dof}";
}
