using System.Numerics;
using Boltup.Engine.Acoustics;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Paths;
using Boltup.Engine.Sensitivity;
using Boltup.Engine.Spectra;
using Boltup.Engine.Targets;

namespace Boltup.Engine.Prediction;

/// <summary>Everything that one prediction found; immutable, and all that the writers see.</summary>
/// <param name="Title">Title of the assembly.</param>
/// <param name="Axis">Frequency lines on which the assembly was coupled.</param>
/// <param name="Operations">One entry per operation, in the order of the assembly file.</param>
/// <param name="Conditioning">How well the interface problem could be solved.</param>
/// <param name="Kernels">Name of the batch kernels that ran.</param>
/// <param name="Diagnostics">Notes and warnings of the run.</param>
public sealed record PredictionResult(
    string Title,
    FrequencyAxis Axis,
    IReadOnlyList<OperationResult> Operations,
    Conditioning Conditioning,
    string Kernels,
    IReadOnlyList<Diagnostic> Diagnostics)
{
    /// <summary>The stiffness of every mount that a joint goes through.</summary>
    public IReadOnlyList<MountSpectrum> Mounts { get; init; } = [];

    /// <summary>One verdict for each target and operation that it holds for.</summary>
    public IReadOnlyList<TargetVerdict> Verdicts { get; init; } = [];
}

/// <summary>What one operation does to the responses and joints.</summary>
/// <param name="Axis">Lines of this operation: those of its forces.</param>
/// <param name="Amplitude">What the magnitude of a spectrum line is.</param>
public sealed record OperationResult(
    string Name,
    FrequencyAxis Axis,
    Amplitude Amplitude,
    IReadOnlyList<ResponseSpectrum> Responses,
    IReadOnlyList<JointForceSpectrum> JointForces)
{
    /// <summary>Takes the responses apart into contributions; null where nobody asked for paths.</summary>
    public OperationPaths? Paths { get; init; }

    /// <summary>For each response its paths by forces and, where anything is joined, by joints; empty where nobody asked for paths.</summary>
    public IReadOnlyList<ResponsePaths> RankedPaths { get; init; } = [];

    /// <summary>For each response what its overall level depends on; empty where nobody asked for paths.</summary>
    public IReadOnlyList<ResponseSensitivities> Sensitivities { get; init; } = [];
}

/// <summary>One response over the lines of its operation.</summary>
/// <param name="Name">The response's name in the assembly file.</param>
/// <param name="Dof">Where it is, as <c>part.point.direction</c>.</param>
/// <param name="Unit">SI unit of the values.</param>
/// <param name="Values">One value per line; of an energy sum the magnitude, with no phase.</param>
public sealed record ResponseSpectrum(string Name, string Dof, Quantity Quantity, string Unit, IReadOnlyList<Complex> Values)
{
    /// <summary>The weighting that the response asks for; null for none.</summary>
    public FrequencyWeighting? Weighting { get; init; }
}

/// <summary>The force a joint carries from the first to the second point of its <c>between</c>, in the axes of the assembly.</summary>
/// <param name="Joint">
/// Name of the joint. A mount with mass effect has two forces in a direction: the one under the joint's own name is that on the second
/// point, and the one that it takes up from the first has <c>, first end</c> behind the name.
/// </param>
/// <param name="Unit"><c>N</c>, or <c>N·m</c> for a rotation.</param>
public sealed record JointForceSpectrum(string Joint, Direction Direction, string Unit, IReadOnlyList<Complex> Values);

/// <summary>1-norm condition number estimates of the interface problem, one per line of the axis; empty when nothing is joined.</summary>
/// <param name="PerLine">Estimate per line, with rotations scaled by <paramref name="RotationLength"/>.</param>
/// <param name="RotationLength">The length in metres by which rotations were divided before the estimate.</param>
public sealed record Conditioning(IReadOnlyList<double> PerLine, double RotationLength)
{
    /// <summary>The largest estimate, or 1 when nothing is joined.</summary>
    public double Worst => PerLine.Count == 0 ? 1 : PerLine.Max();
}

/// <summary>What the magnitude of a line of a spectrum is.</summary>
public enum Amplitude
{
    /// <summary>Root mean square; the default, said by a note where nothing states it.</summary>
    Rms,

    /// <summary>Peak: √2 times the root mean square of a sine.</summary>
    Peak,
}
