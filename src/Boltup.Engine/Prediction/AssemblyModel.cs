using Boltup.Engine.Coupling;
using Boltup.Engine.Parts;
using Boltup.Engine.Spectra;
using Boltup.Engine.Targets;

namespace Boltup.Engine.Prediction;

/// <summary>An assembly ready to be computed: every name resolved, every axis agreed.</summary>
/// <param name="Axis">Lines on which the parts are coupled.</param>
public sealed record AssemblyModel(
    string Title,
    FrequencyAxis Axis,
    IReadOnlyList<PlacedPart> Parts,
    IReadOnlyList<Joint> Joints,
    IReadOnlyList<Operation> Operations,
    IReadOnlyList<Response> Responses)
{
    /// <summary>Limits on responses.</summary>
    public IReadOnlyList<Target> Targets { get; init; } = [];

    /// <summary>Distance in m beyond which two joined points draw a warning.</summary>
    public double JointGap { get; init; } = 0.005;
}
