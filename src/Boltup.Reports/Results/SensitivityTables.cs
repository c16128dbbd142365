using System.Text;
using Boltup.Engine.Prediction;
using Boltup.Engine.Sensitivity;
using Boltup.Engine.Spectra;

namespace Boltup.Reports.Results;

/// <summary>The table of sensitivities.</summary>
public static class SensitivityTables
{
    /// <summary>The name of what is changed, in files.</summary>
    public static string NameOf(SensitivityKind kind) => kind switch
    {
        SensitivityKind.MountStiffness => "mount_stiffness",
        SensitivityKind.MountLoss => "mount_loss_factor",
        SensitivityKind.Force => "force",
        _ => "frf_row",
    };

    /// <summary>Writes <c>sensitivity.csv</c>: by how many dB an overall level grows per percent or dB of what it depends on.</summary>
    public static void Write(Stream output, PredictionResult result)
    {
        var csv = new CsvBytes(output);
        csv.Text("operation,response,kind,name,direction,db,per\n"u8);
        foreach (OperationResult operation in result.Operations)
        {
            foreach (ResponseSensitivities response in operation.Sensitivities)
            {
                foreach (LevelSensitivity level in response.Levels)
                {
                    csv.Text(CsvBytes.Field(operation.Name)).Comma().Text(CsvBytes.Field(response.Response)).Comma();
                    WriteLevel(csv, level);
                }
            }
        }

        csv.Flush();
    }

    private static void WriteLevel(CsvBytes csv, LevelSensitivity level)
    {
        SensitivityParameter parameter = level.Parameter;
        csv.Text(Encoding.UTF8.GetBytes(NameOf(parameter.Kind))).Comma().Text(CsvBytes.Field(parameter.Name)).Comma()
            .Text(Encoding.UTF8.GetBytes(parameter.Direction is { } direction ? Dof.NameOf(direction) : "")).Comma();
        if (double.IsFinite(level.Decibels))
        {
            csv.Number(level.Decibels);
        }

        csv.Comma().Text(parameter.Kind is SensitivityKind.MountStiffness or SensitivityKind.MountLoss ? "%"u8 : "dB"u8).EndRow();
    }
}
