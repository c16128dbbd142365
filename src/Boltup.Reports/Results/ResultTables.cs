using System.Numerics;
using System.Text;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;

namespace Boltup.Reports.Results;

/// <summary>The tables of a prediction.</summary>
public static class ResultTables
{
    /// <summary>Writes <c>responses.csv</c>.</summary>
    public static void WriteResponses(Stream output, PredictionResult result)
    {
        var csv = new CsvBytes(output);
        csv.Text("operation,response,frequency_hz,real,imag,unit\n"u8);
        foreach (OperationResult operation in result.Operations)
        {
            byte[] name = CsvBytes.Field(operation.Name);
            foreach (ResponseSpectrum response in operation.Responses)
            {
                WriteSpectrum(csv, [.. name, (byte)',', .. CsvBytes.Field(response.Name)], operation.Axis, response.Values, response.Unit);
            }
        }

        csv.Flush();
    }

    /// <summary>Writes <c>joint_forces.csv</c>.</summary>
    public static void WriteJointForces(Stream output, PredictionResult result)
    {
        var csv = new CsvBytes(output);
        csv.Text("operation,joint,direction,frequency_hz,real,imag,unit\n"u8);
        foreach (OperationResult operation in result.Operations)
        {
            byte[] name = CsvBytes.Field(operation.Name);
            foreach (JointForceSpectrum force in operation.JointForces)
            {
                byte[] key = [.. name, (byte)',', .. CsvBytes.Field(force.Joint), (byte)',', .. Encoding.UTF8.GetBytes(Dof.NameOf(force.Direction))];
                WriteSpectrum(csv, key, operation.Axis, force.Values, force.Unit);
            }
        }

        csv.Flush();
    }

    private static void WriteSpectrum(CsvBytes csv, byte[] key, FrequencyAxis axis, IReadOnlyList<Complex> values, string unit)
    {
        byte[] unitField = Encoding.UTF8.GetBytes(unit);
        for (int line = 0; line < axis.Count; line++)
        {
            csv.Text(key).Comma()
                .Number(axis[line]).Comma()
                .Number(values[line].Real).Comma()
                .Number(values[line].Imaginary).Comma()
                .Text(unitField)
                .EndRow();
        }
    }
}
