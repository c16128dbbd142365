using System.Text;
using Boltup.Engine.Evidence;
using Boltup.Engine.Identification;
using Boltup.Engine.VirtualPoints;
using Boltup.Reports.Results;

namespace Boltup.Reports.Identification;

/// <summary>Writes <c>quality.csv</c>: what the data and the inversion were like at each line, one figure a row.</summary>
internal static class QualityTable
{
    public static void Write(Stream output, IdentificationReport report)
    {
        var csv = new CsvBytes(output);
        csv.Text("figure,of,frequency_hz,value\n"u8);
        IdentificationResult result = report.Result;
        SingularSpectrum singular = result.SingularValues;
        Rows(csv, report, "condition number", "indicator FRFs", singular.Condition);
        for (int i = 0; i < singular.Values.Count; i++)
        {
            Rows(csv, report, "singular value (m/N)", FormattableString.Invariant($"{i + 1}"), line => singular.Values[i][line]);
        }

        foreach (IdentifiedOperation operation in result.Operations)
        {
            Rows(csv, report, "directions kept", operation.Name, line => operation.Lines[line].Kept);
            Rows(csv, report, "damping (share of the largest singular value)", operation.Name, line => operation.Lines[line].Damping);
        }

        if (result.Coherence is { } coherence)
        {
            Rows(csv, report, "mean coherence", "installed FRFs", line => coherence.Mean[line]);
            Rows(csv, report, "least coherence", "installed FRFs", line => coherence.Least[line]);
        }

        WriteAgreement(csv, report, "interface completeness", result.Quality.Completeness);
        WriteAgreement(csv, report, "round trip over the interface", result.Quality.RoundTrip);
        foreach (VirtualPointQuality point in result.Quality.VirtualPoints)
        {
            Rows(csv, report, $"rigidity of {(point.OfImpacts ? "impacts" : "sensors")}", point.Point, line => point.PerLine[line]);
        }

        WriteConsistency(csv, report);
        WriteRank(csv, report);
        csv.Flush();
    }

    /// <summary>Consistency, blind to a common factor, beside the level difference.</summary>
    private static void WriteAgreement(CsvBytes csv, IdentificationReport report, string figure, FrfAgreement? agreement)
    {
        if (agreement is not null)
        {
            Rows(csv, report, figure, "consistency", line => agreement.Consistency[line]);
            Rows(csv, report, figure, "level difference (dB)", line => agreement.LevelDifferenceDb[line]);
        }
    }

    private static void WriteConsistency(CsvBytes csv, IdentificationReport report)
    {
        foreach (OperationValidation validation in report.Evidence.Validations.Where(each => each.Installation is null))
        {
            Rows(csv, report, "on-board consistency", validation.Operation, line => validation.Report.Consistency[line]);
        }
    }

    private static void WriteRank(CsvBytes csv, IdentificationReport report)
    {
        foreach (IdentifiedOperation operation in report.Result.Operations.Where(each => each.Phase == PhaseReference.Free))
        {
            int[] ranks = SpectralRank.Of(operation.Forces);
            Rows(csv, report, "rank of G_ff", operation.Name, line => ranks[line]);
        }
    }

    private static void Rows(CsvBytes csv, IdentificationReport report, string figure, string of, Func<int, double> value)
    {
        byte[] key = [.. Encoding.UTF8.GetBytes(figure), (byte)',', .. CsvBytes.Field(of)];
        for (int line = 0; line < report.Result.Axis.Count; line++)
        {
            csv.Text(key).Comma().Number(report.Result.Axis[line]).Comma();
            (double.IsFinite(value(line)) ? csv.Number(value(line)) : csv).EndRow();
        }
    }
}
