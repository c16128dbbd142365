using System.Globalization;
using Boltup.Cli.Terminal;
using Boltup.Engine.Acoustics;
using Boltup.Engine.Paths;
using Boltup.Engine.Prediction;
using Boltup.Reports.Results;

namespace Boltup.Cli.Commands;

/// <summary>The strongest paths of every response, as a prediction prints them: by joints where anything is joined.</summary>
internal static class PathSummary
{
    private const int Strongest = 3;

    public static void Print(Screen screen, PredictionResult result)
    {
        if (!result.Operations.Any(operation => operation.RankedPaths.Count > 0))
        {
            return;
        }

        var table = new TextTable(
            ("operation", false), ("response", false), ("strongest path", false), ("second", false), ("third", false));
        foreach (OperationResult operation in result.Operations)
        {
            foreach (ResponseSpectrum response in operation.Responses)
            {
                table.Add([operation.Name, response.Name, .. CellsOf(operation, response)]);
            }
        }

        table.Write(screen.Out);
        screen.Out.WriteLine("in dB; in brackets what the overall level would change by with this path 6 dB lower");
        screen.Out.WriteLine();
    }

    private static string[] CellsOf(OperationResult operation, ResponseSpectrum response)
    {
        ResponsePaths paths = operation.RankedPaths.Last(paths => paths.Response == response.Name);
        LevelReference reference = LevelReference.For(response.Quantity, response.Unit);
        string[] cells = [.. paths.Overall.Paths.Take(Strongest).Where(path => path.Power > 0).Select(path => string.Create(
            CultureInfo.InvariantCulture,
            $"{path.Path.Name} {reference.Decibels(Math.Sqrt(path.Power)):F1} ({SignedText.Of(path.HalvedChange, 1)})"))];
        return [.. cells, .. Enumerable.Repeat("", Strongest - cells.Length)];
    }
}
