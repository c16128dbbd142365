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
            byte[][] hz = FrequenciesOf(operation.Axis);
            foreach (ResponseSpectrum response in operation.Responses)
            {
                WriteSpectrum(csv, [.. name, (byte)',', .. CsvBytes.Field(response.Name)], hz, response.Values, response.Unit);
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
            byte[][] hz = FrequenciesOf(operation.Axis);
            foreach (JointForceSpectrum force in operation.JointForces)
            {
                byte[] key = [.. name, (byte)',', .. CsvBytes.Field(force.Joint), (byte)',', .. Encoding.UTF8.GetBytes(Dof.NameOf(force.Direction))];
                WriteSpectrum(csv, key, hz, force.Values, force.Unit);
            }
        }

        csv.Flush();
    }

    /// <summary>Every spectrum of an operation has the same frequencies, so they are turned into text once.</summary>
    internal static byte[][] FrequenciesOf(FrequencyAxis axis)
    {
        var texts = new byte[axis.Count][];
        for (int line = 0; line < texts.Length; line++)
        {
            texts[line] = CsvBytes.Format(axis[line]);
        }

        return texts;
    }

    internal static void WriteSpectrum(CsvBytes csv, byte[] key, byte[][] hz, IReadOnlyList<Complex> values, string unit)
    {
        byte[] unitField = Encoding.UTF8.GetBytes(unit);
        for (int line = 0; line < hz.Length; line++)
        {
            csv.Text(key).Comma()
                .Text(hz[line]).Comma()
                .Number(values[line].Real).Comma()
                .Number(values[line].Imaginary).Comma()
                .Text(unitField)
                .EndRow();
        }
    }
}
