using System.Text;
using Boltup.Engine.Acoustics;
using Boltup.Engine.Paths;
using Boltup.Engine.Prediction;

namespace Boltup.Reports.Results;

/// <summary>The tables of contributions.</summary>
public static class PathTables
{
    /// <summary>The name of a kind of path in files.</summary>
    public static string NameOf(PathKind kind) => kind switch
    {
        PathKind.Force => "force",
        PathKind.Joint => "joint",
        _ => "direct",
    };

    /// <summary>The name of a view in files.</summary>
    public static string NameOf(PathView view) => view == PathView.Forces ? "forces" : "joints";

    /// <summary>
    /// Writes <c>contributions.csv</c>: each path over all lines, then per third octave with its nominal mid-band frequency; the strongest path
    /// first. A level that is not finite is left empty.
    /// </summary>
    public static void WriteContributions(Stream output, PredictionResult result)
    {
        var csv = new CsvBytes(output);
        csv.Text("operation,response,view,kind,path,band_hz,level_db,db_reference,share,change_if_halved_db\n"u8);
        foreach (OperationResult operation in result.Operations)
        {
            foreach (ResponsePaths paths in operation.RankedPaths)
            {
                ResponseSpectrum response = operation.Responses.First(response => response.Name == paths.Response);
                byte[] key = Key(operation.Name, response.Name, NameOf(paths.View));
                LevelReference reference = LevelReference.For(response.Quantity, response.Unit);
                foreach (PathRanking ranking in paths.Bands.Prepend(paths.Overall))
                {
                    WriteRanking(csv, key, ranking, reference);
                }
            }
        }

        csv.Flush();
    }

    /// <summary>Writes <c>contribution_lines.csv</c>: every contribution at every line; where energies add, a magnitude without phase.</summary>
    public static void WriteLines(Stream output, PredictionResult result)
    {
        var csv = new CsvBytes(output);
        csv.Text("operation,response,view,kind,path,frequency_hz,real,imag,unit\n"u8);
        foreach (OperationResult operation in result.Operations.Where(operation => operation.Paths is not null))
        {
            byte[][] hz = ResultTables.FrequenciesOf(operation.Axis);
            foreach (ResponsePaths paths in operation.RankedPaths)
            {
                int index = operation.Responses.TakeWhile(response => response.Name != paths.Response).Count();
                byte[] key = Key(operation.Name, paths.Response, NameOf(paths.View));
                WriteLines(csv, key, hz, operation.Paths!.Of(index, paths.View), operation.Responses[index].Unit);
            }
        }

        csv.Flush();
    }

    private static void WriteLines(CsvBytes csv, byte[] key, byte[][] hz, PathSpectra spectra, string unit)
    {
        for (int path = 0; path < spectra.Paths.Count; path++)
        {
            ResultTables.WriteSpectrum(csv, [.. key, (byte)',', .. Key(spectra.Paths[path])], hz, spectra.Contribution(path), unit);
        }
    }

    private static void WriteRanking(CsvBytes csv, byte[] key, PathRanking ranking, LevelReference reference)
    {
        byte[] band = ranking.Band.Octave is { } octave ? CsvBytes.Format(octave.NominalHz) : Encoding.UTF8.GetBytes("overall");
        foreach (RankedPath path in ranking.Paths)
        {
            csv.Text(key).Comma().Text(Key(path.Path)).Comma().Text(band).Comma();
            Finite(csv, reference.Decibels(Math.Sqrt(path.Power))).Comma().Text(CsvBytes.Field(reference.Text)).Comma();
            Finite(csv, path.Share).Comma();
            Finite(csv, path.HalvedChange).EndRow();
        }
    }

    private static CsvBytes Finite(CsvBytes csv, double value) => double.IsFinite(value) ? csv.Number(value) : csv;

    private static byte[] Key(string operation, string response, string view) =>
        [.. CsvBytes.Field(operation), (byte)',', .. CsvBytes.Field(response), (byte)',', .. Encoding.UTF8.GetBytes(view)];

    private static byte[] Key(TransferPath path) => [.. Encoding.UTF8.GetBytes(NameOf(path.Kind)), (byte)',', .. CsvBytes.Field(path.Name)];
}
