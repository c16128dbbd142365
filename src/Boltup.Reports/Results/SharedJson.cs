using System.Text.Json;
using Boltup.Engine.Spectra;

namespace Boltup.Reports.Results;

/// <summary>What every summary says in the same way.</summary>
internal static class SharedJson
{
    public static void WriteAxis(Utf8JsonWriter json, FrequencyAxis axis)
    {
        json.WriteStartObject("frequencies");
        json.WriteNumber("first_hz", axis.FirstHz);
        json.WriteNumber("last_hz", axis.LastHz);
        json.WriteNumber("lines", axis.Count);
        json.WriteEndObject();
    }

    public static void WriteInputs(Utf8JsonWriter json, IReadOnlyList<InputFingerprint> inputs, string name = "inputs")
    {
        json.WriteStartArray(name);
        foreach (InputFingerprint input in inputs)
        {
            json.WriteStartObject();
            json.WriteString("file", input.File);
            json.WriteString("sha256", input.Sha256);
            json.WriteEndObject();
        }

        json.WriteEndArray();
    }
}
