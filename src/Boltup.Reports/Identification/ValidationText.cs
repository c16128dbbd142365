using System.Globalization;
using Boltup.Engine.Acoustics;
using Boltup.Engine.Evidence;
using Boltup.Engine.Identification;
using Boltup.Reports.Results;

namespace Boltup.Reports.Identification;

/// <summary>Says what was checked and what came of it; never a bare pass.</summary>
public static class ValidationText
{
    /// <summary>All checks of an operation.</summary>
    public static string Of(BenchEvidence evidence, string operation)
    {
        string[] texts = [.. evidence.Validations.Where(each => each.Operation == operation).Select(Of)];
        return texts.Length == 0 ? "none: no sensor was left out of the identification" : string.Join("; ", texts);
    }

    /// <summary>One check with its figures.</summary>
    public static string Of(OperationValidation validation)
    {
        ValidationReport report = validation.Report;
        string what = report.Check == ValidationCheck.OnBoard ? "on board" : $"transfer to {validation.Installation}";
        (OctaveBand band, double worst) = ValidationBands.Worst(report, 1).DefaultIfEmpty().First();
        return string.Create(
            CultureInfo.InvariantCulture,
            $"{what}, {report.Dofs.Count} dofs: level {SignedText.Of(report.OverallLevelDifferenceDb, 2)} dB, error with phase {100 * report.RelativeError:0.##} %, worst third octave {SignedText.Of(worst, 1)} dB at {band}");
    }
}
