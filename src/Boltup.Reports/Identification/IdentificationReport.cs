using Boltup.Engine.Identification;
using Boltup.Reports.Results;

namespace Boltup.Reports.Identification;

/// <summary>Everything that the writers of an identification see.</summary>
/// <param name="Holds">The band in which the forces hold, as the evidence says.</param>
/// <param name="Inputs">Fingerprints of all inputs.</param>
public sealed record IdentificationReport(
    IdentificationResult Result,
    BenchEvidence Evidence,
    ForceBand Holds,
    SourceDescription Source,
    IReadOnlyList<InputFingerprint> Inputs,
    string ProgramVersion)
{
    /// <summary>Closes every caption.</summary>
    public string Provenance => $"{Result.Title} · inputs {InputFingerprint.Abbreviate(Inputs)} · boltup {ProgramVersion}";

    /// <summary>How the forces were found, in words.</summary>
    public string Method => Result.Solve switch
    {
        { Method: SolveMethod.Truncated, Threshold: null } => "in-situ inversion, singular values below the noise of the FRFs left out",
        { Method: SolveMethod.Truncated, Threshold: { } share } => FormattableString.Invariant($"in-situ inversion, singular values below {share} of the largest left out"),
        { Method: SolveMethod.Tikhonov, Rule: DampingRule.CrossValidation } => "in-situ inversion, Tikhonov by generalised cross-validation",
        { Method: SolveMethod.Tikhonov, Rule: DampingRule.LCurve } => "in-situ inversion, Tikhonov by the L-curve",
        { Method: SolveMethod.Tikhonov, Damping: double share } => FormattableString.Invariant($"in-situ inversion, Tikhonov with λ at {share} of the largest singular value"),
        _ => "in-situ inversion by least squares",
    };
}
