using System.Numerics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Evidence;

/// <summary>Compares predicted with measured responses at dofs that took no part in an identification (on-board validation: ISO 20270).</summary>
public static class ValidationComparison
{
    /// <param name="predicted">Responses to the identified forces.</param>
    /// <param name="measured">At least one dof: the same at the same lines, in the same quantities.</param>
    public static ValidationReport Compare(ValidationCheck check, SpectrumSet predicted, SpectrumSet measured)
    {
        SquareFrf.RequireLines(predicted.Axis, measured.Axis);
        if (!predicted.Dofs.SequenceEqual(measured.Dofs))
        {
            throw new ArgumentException($"predicted at {string.Join(", ", predicted.Dofs)}, measured at {string.Join(", ", measured.Dofs)}");
        }

        AgreementSums[] lines = AgreementSums.PerLine(measured.Dofs, predicted.Values, measured.Values);
        AgreementSums total = AgreementSums.Total(lines);
        return new ValidationReport(
            check,
            measured.Axis,
            [.. measured.Dofs.Select((dof, i) => Compare(dof, predicted.Values[i], measured.Values[i]))],
            [.. lines.Select(line => measured.Dofs.Count > 1 ? line.Consistency : double.NaN)],
            [.. lines.Select(line => line.LevelDifferenceDb)],
            total.RelativeError,
            total.LevelDifferenceDb);
    }

    private static ValidationDof Compare(Dof dof, Complex[] predicted, Complex[] measured)
    {
        AgreementSums total = AgreementSums.Total(AgreementSums.PerLine([dof], [predicted], [measured]));
        return new ValidationDof(
            dof,
            predicted,
            measured,
            [.. predicted.Zip(measured, (p, m) => AgreementSums.Decibel(KindWeights.Square(p), KindWeights.Square(m)))],
            total.RelativeError,
            total.LevelDifferenceDb);
    }
}
