using Boltup.Engine.Parts;
using Boltup.Engine.Spectra;
using Boltup.Engine.VirtualPoints;

namespace Boltup.Engine.Identification;

/// <summary>A bench ready to be computed: names resolved, axes agreed, operational spectra read.</summary>
/// <param name="Axis">Lines that the FRFs and all operations share.</param>
/// <param name="Installed">FRFs of the installed source at rest, from interface dofs to all sensors.</param>
/// <param name="Interface">Where the blocked forces act.</param>
/// <param name="Indicators">Sensor dofs of the identification; at least as many as interface dofs.</param>
/// <param name="Validation">Sensor dofs that take no part in it.</param>
public sealed record BenchModel(
    string Title,
    FrequencyAxis Axis,
    IPartModel Installed,
    IReadOnlyList<Dof> Interface,
    IReadOnlyList<Dof> Indicators,
    IReadOnlyList<Dof> Validation,
    IReadOnlyList<BenchOperation> Operations,
    SolveChoice Solve)
{
    /// <summary>Coherence of the installed FRFs; null when the bench gives none.</summary>
    public BenchCoherence? Coherence { get; init; }

    /// <summary>Virtual points of the interface; their channels are dofs of <see cref="Data"/>.</summary>
    public IReadOnlyList<VirtualPoint> VirtualPoints { get; init; } = [];

    /// <summary>The installed FRFs as measured, without virtual points; null where there are none.</summary>
    public IPartModel? Data { get; init; }

    /// <summary>All sensors, indicators first.</summary>
    public IReadOnlyList<Dof> Sensors { get; } = [.. Indicators, .. Validation];
}
