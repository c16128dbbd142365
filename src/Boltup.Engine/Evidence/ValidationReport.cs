using System.Globalization;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Evidence;

/// <summary>
/// How well identified forces predict responses that took no part in their identification. Figures over several dofs weigh motion,
/// rotation and sound so that each kind counts with its own mean square.
/// </summary>
/// <param name="Check">Which check was made.</param>
/// <param name="Axis">The lines of every list.</param>
/// <param name="Consistency">
/// Per line |Σ p m*|²/(Σ|p|² Σ|m|²) over all dofs: 1 where both have the same pattern of magnitude and phase. Blind to a common factor,
/// so it goes with <paramref name="LevelDifferenceDb"/>. NaN where all are zero, and for a single dof, which has no pattern.
/// </param>
/// <param name="LevelDifferenceDb">Per line 10 lg Σ|p|²/Σ|m|² over all dofs.</param>
/// <param name="RelativeError">‖p − m‖₂/‖m‖₂ over all dofs and lines, phase included.</param>
/// <param name="OverallLevelDifferenceDb">10 lg Σ|p|²/Σ|m|² over all dofs and lines.</param>
public sealed record ValidationReport(
    ValidationCheck Check,
    FrequencyAxis Axis,
    IReadOnlyList<ValidationDof> Dofs,
    IReadOnlyList<double> Consistency,
    IReadOnlyList<double> LevelDifferenceDb,
    double RelativeError,
    double OverallLevelDifferenceDb)
{
    /// <summary>Mean of <see cref="Consistency"/> over the lines where it is a number.</summary>
    public double MeanConsistency => Consistency.Where(value => !double.IsNaN(value)).DefaultIfEmpty(double.NaN).Average();

    /// <summary>What was checked, and what the check cannot show: never a bare pass.</summary>
    public string Statement => Check == ValidationCheck.OnBoard
        ? string.Create(
            CultureInfo.InvariantCulture,
            $"on-board validation at {Dofs.Count} dofs that took no part in the identification; they share the dynamics of the bench, so agreement here does not show that the forces hold on another receiver")
        : string.Create(
            CultureInfo.InvariantCulture,
            $"transfer validation at {Dofs.Count} dofs of another installation, whose dynamics took no part in the identification; it speaks for receivers like that one");
}
