using System.Numerics;
using System.Text;
using Boltup.Engine.Acoustics;
using Boltup.Engine.Evidence;
using Boltup.Engine.Identification;
using Boltup.Engine.Spectra;
using Boltup.Reports.Results;

namespace Boltup.Reports.Identification;

/// <summary>The tables of an identification.</summary>
public static class IdentificationTables
{
    /// <summary>Forces that an assembly takes as they are: spectra, or auto and cross spectra where there is no phase reference.</summary>
    public static void WriteForces(Stream output, IdentificationResult result, IdentifiedOperation operation)
    {
        if (operation.Phase == PhaseReference.Common)
        {
            WriteSpectra(output, operation.Forces[0]);
        }
        else
        {
            WriteCrossSpectra(output, result, operation);
        }
    }

    /// <summary><c>dof,frequency_hz,real,imag</c>.</summary>
    public static void WriteSpectra(Stream output, SpectrumSet set)
    {
        var csv = new CsvBytes(output);
        csv.Text("dof,frequency_hz,real,imag\n"u8);
        for (int dof = 0; dof < set.Dofs.Count; dof++)
        {
            WriteCurve(csv, CsvBytes.Field(set.Dofs[dof].ToString()), set.Axis, set.Values[dof]);
        }

        csv.Flush();
    }

    /// <summary>G_ff as <c>row,column,frequency_hz,real,imag</c>: row force times the conjugate of the column force.</summary>
    private static void WriteCrossSpectra(Stream output, IdentificationResult result, IdentifiedOperation operation)
    {
        var csv = new CsvBytes(output);
        csv.Text("row,column,frequency_hz,real,imag\n"u8);
        for (int i = 0; i < result.Interface.Count * result.Interface.Count; i++)
        {
            (int row, int column) = Math.DivRem(i, result.Interface.Count);
            byte[] key = [.. CsvBytes.Field(result.Interface[row].ToString()), (byte)',', .. CsvBytes.Field(result.Interface[column].ToString())];
            WriteCurve(csv, key, result.Axis, [.. Enumerable.Range(0, result.Axis.Count).Select(line => operation.CrossSpectrum(row, column, line))]);
        }

        csv.Flush();
    }

    private static void WriteCurve(CsvBytes csv, byte[] key, FrequencyAxis axis, Complex[] values)
    {
        for (int line = 0; line < axis.Count; line++)
        {
            csv.Text(key).Comma().Number(axis[line]).Comma().Number(values[line].Real).Comma().Number(values[line].Imaginary).EndRow();
        }
    }

    /// <summary>Predicted against measured per line: motion as acceleration in m/s², sound in Pa.</summary>
    public static void WriteValidation(Stream output, IdentificationReport report)
    {
        var csv = new CsvBytes(output);
        csv.Text("operation,check,dof,frequency_hz,predicted_real,predicted_imag,measured_real,measured_imag,difference_db\n"u8);
        foreach (OperationValidation validation in report.Evidence.Validations)
        {
            foreach (ValidationDof dof in validation.Report.Dofs)
            {
                byte[] key = [.. KeyOf(validation), (byte)',', .. CsvBytes.Field(dof.Dof.ToString())];
                WriteValidation(csv, key, validation.Report.Axis, dof);
            }
        }

        csv.Flush();
    }

    private static void WriteValidation(CsvBytes csv, byte[] key, FrequencyAxis axis, ValidationDof dof)
    {
        for (int line = 0; line < axis.Count; line++)
        {
            csv.Text(key).Comma().Number(axis[line]).Comma()
                .Number(dof.Predicted[line].Real).Comma().Number(dof.Predicted[line].Imaginary).Comma()
                .Number(dof.Measured[line].Real).Comma().Number(dof.Measured[line].Imaginary).Comma()
                .Decibel(dof.DifferenceDb[line]).EndRow();
        }
    }

    /// <summary>Level differences per third octave.</summary>
    public static void WriteValidationBands(Stream output, IdentificationReport report)
    {
        var csv = new CsvBytes(output);
        csv.Text("operation,check,dof,band_hz,difference_db\n"u8);
        foreach (OperationValidation validation in report.Evidence.Validations)
        {
            var bands = new BandSums(validation.Report.Axis);
            foreach (ValidationDof dof in validation.Report.Dofs)
            {
                byte[] key = [.. KeyOf(validation), (byte)',', .. CsvBytes.Field(dof.Dof.ToString())];
                for (int band = 0; band < bands.Bands.Count; band++)
                {
                    csv.Text(key).Comma().Number(bands.Bands[band].NominalHz).Comma().Decibel(ValidationBands.Difference(dof, bands, band)).EndRow();
                }
            }
        }

        csv.Flush();
    }

    private static byte[] KeyOf(OperationValidation validation) =>
        [.. CsvBytes.Field(validation.Operation), (byte)',', .. validation.Report.Check == ValidationCheck.OnBoard ? "on board"u8 : "transfer"u8];

    /// <summary>Level of the contact force that the bench would measure against the blocked force, per dof and for all together.</summary>
    public static void WriteStiffness(Stream output, BenchStiffness stiffness)
    {
        var csv = new CsvBytes(output);
        csv.Text("dof,frequency_hz,contact_to_blocked_db\n"u8);
        foreach ((string dof, IReadOnlyList<double> ratios) in stiffness.Dofs.Select(dof => (dof.Dof.ToString(), dof.RatioDb)).Append(("all", stiffness.OverallRatioDb)))
        {
            byte[] key = Encoding.UTF8.GetBytes(dof);
            for (int line = 0; line < stiffness.Axis.Count; line++)
            {
                csv.Text(key).Comma().Number(stiffness.Axis[line]).Comma().Decibel(ratios[line]).EndRow();
            }
        }

        csv.Flush();
    }

    /// <summary>A level difference; empty where there is none.</summary>
    private static CsvBytes Decibel(this CsvBytes csv, double value) => double.IsFinite(value) ? csv.Number(value) : csv;
}
