using System.Text.Json;
using Boltup.Engine.Acoustics;
using Boltup.Engine.Paths;
using Boltup.Engine.Prediction;

namespace Boltup.Reports.Results;

/// <summary>The strongest paths of every response, as <c>summary.json</c> has them.</summary>
internal static class PathJson
{
    private const int Strongest = 3;

    /// <summary>Writes <c>paths</c>; nothing where nobody asked for them.</summary>
    public static void Write(Utf8JsonWriter json, PredictionResult result)
    {
        if (!result.Operations.Any(operation => operation.RankedPaths.Count > 0))
        {
            return;
        }

        json.WriteStartArray("paths");
        foreach (OperationResult operation in result.Operations)
        {
            foreach (ResponsePaths paths in operation.RankedPaths)
            {
                WriteResponse(json, operation, paths);
            }
        }

        json.WriteEndArray();
    }

    private static void WriteResponse(Utf8JsonWriter json, OperationResult operation, ResponsePaths paths)
    {
        ResponseSpectrum response = operation.Responses.First(response => response.Name == paths.Response);
        LevelReference reference = LevelReference.For(response.Quantity, response.Unit);
        json.WriteStartObject();
        json.WriteString("operation", operation.Name);
        json.WriteString("response", paths.Response);
        json.WriteString("view", PathTables.NameOf(paths.View));
        json.WriteString("db_reference", reference.Text);
        json.WriteStartArray("strongest");
        foreach (RankedPath path in paths.Overall.Paths.Take(Strongest))
        {
            WritePath(json, path, reference);
        }

        json.WriteEndArray();
        WritePairs(json, paths.Overall.Cancelling);
        json.WriteEndObject();
    }

    private static void WritePath(Utf8JsonWriter json, RankedPath path, LevelReference reference)
    {
        json.WriteStartObject();
        json.WriteString("path", path.Path.Name);
        json.WriteString("kind", PathTables.NameOf(path.Path.Kind));
        json.WriteFinite("level_db", reference.Decibels(Math.Sqrt(path.Power)));
        json.WriteFinite("share", path.Share);
        json.WriteFinite("change_if_halved_db", path.HalvedChange);
        json.WriteEndObject();
    }

    private static void WritePairs(Utf8JsonWriter json, IReadOnlyList<PathPair> pairs)
    {
        json.WriteStartArray("cancelling");
        foreach (PathPair pair in pairs)
        {
            json.WriteStartObject();
            json.WriteString("first", pair.First.Name);
            json.WriteString("second", pair.Second.Name);
            json.WriteFinite("cancelled", pair.Cancelled);
            json.WriteEndObject();
        }

        json.WriteEndArray();
    }
}
