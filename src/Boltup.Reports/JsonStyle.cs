using System.Text.Encodings.Web;
using System.Text.Json;

namespace Boltup.Reports;

/// <summary>How all JSON of Boltup is laid out: indented, with µ and ² as they are, LF at line ends.</summary>
internal static class JsonStyle
{
    public static JsonWriterOptions Options => new()
    {
        Indented = true,
        NewLine = "\n",
        Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping,
    };

    /// <summary>JSON knows no infinity and no NaN: they become null.</summary>
    public static void WriteFinite(this Utf8JsonWriter json, string name, double value)
    {
        if (double.IsFinite(value))
        {
            json.WriteNumber(name, value);
        }
        else
        {
            json.WriteNull(name);
        }
    }
}
