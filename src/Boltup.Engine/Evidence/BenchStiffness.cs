using System.Globalization;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Evidence;

/// <summary>
/// How far the contact forces that an installation measures are from the blocked forces of the source: is the bench stiff enough to take
/// one for the other? Levels are 20 lg |contact|/|blocked|, NaN where the blocked force is zero.
/// </summary>
/// <param name="Axis">The lines of every list.</param>
/// <param name="Dofs">One entry per interface dof.</param>
/// <param name="OverallRatioDb">Per line: all forces together, by power; moments only where there are no forces.</param>
/// <param name="RelativeDifference">Per line: ‖contact − blocked‖₂/‖blocked‖₂ over the same dofs, phase included.</param>
/// <param name="TotalDifference">‖contact − blocked‖₂/‖blocked‖₂ over all lines; the mean square over lines where no forces are known.</param>
/// <param name="Agreement">Up to where <paramref name="OverallRatioDb"/> stays within each limit.</param>
public sealed record BenchStiffness(
    FrequencyAxis Axis,
    IReadOnlyList<BenchStiffnessDof> Dofs,
    IReadOnlyList<double> OverallRatioDb,
    IReadOnlyList<double> RelativeDifference,
    double TotalDifference,
    IReadOnlyList<AgreementLimit> Agreement)
{
    /// <summary>The limits in dB within which agreement is looked for.</summary>
    public static IReadOnlyList<double> LimitsDb { get; } = [1, 3, 10];

    /// <summary>How far off the contact forces are, and up to where they would pass for blocked forces.</summary>
    public string Statement => string.Create(
        CultureInfo.InvariantCulture,
        $"contact forces on the bench differ from the blocked forces by {100 * TotalDifference:F1} % (2-norm over all lines, phase included); their levels agree {string.Join(", ", Agreement)}");

    /// <summary>The widest agreement that every dof shares for a limit of <see cref="LimitsDb"/>, null when one fails at the first line.</summary>
    public double? AllDofsAgreeUpToHz(double limitDb)
    {
        IEnumerable<double?> ends = Dofs.Select(dof => dof.Agreement.Single(limit => limit.LimitDb == limitDb).UpToHz);
        return ends.Contains(null) ? null : ends.Min();
    }
}
