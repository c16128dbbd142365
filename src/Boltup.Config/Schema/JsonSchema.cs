using System.Text;
using System.Text.Encodings.Web;
using System.Text.Json;
using Boltup.Config.Binding;
using Boltup.Config.Documents;

namespace Boltup.Config.Schema;

/// <summary>JSON Schema (draft 2020-12) of the document kinds, for editors; made from the shapes that loading checks.</summary>
public static class JsonSchema
{
    private const string Dialect = "https://json-schema.org/draft/2020-12/schema";
    private const string BasedOn = "based_on";

    /// <summary>The schema as indented text, the same bytes every time.</summary>
    public static string Of(DocumentKind kind)
    {
        Shape shape = kind switch
        {
            DocumentKind.Part => PartShape.Root,
            DocumentKind.Bench => BenchShape.Root,
            DocumentKind.Forces => ForcesShape.Root,
            DocumentKind.Pins => PinsShape.Root,
            _ => AssemblyShape.Root,
        };
        using var stream = new MemoryStream();
        var options = new JsonWriterOptions { Indented = true, NewLine = "\n", Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping };
        using (var json = new Utf8JsonWriter(stream, options))
        {
            WriteRoot(json, shape, kind);
        }

        return Encoding.UTF8.GetString(stream.ToArray()) + "\n";
    }

    private static void WriteRoot(Utf8JsonWriter json, Shape shape, DocumentKind kind)
    {
        json.WriteStartObject();
        json.WriteString("$schema", Dialect);
        json.WriteString("title", $"boltup {DocumentHeader.Supported[(int)kind]} document, version 1");
        if (shape.Find(BasedOn) is null)
        {
            new SchemaWriter(json, isOverlay: false).WriteShape(shape);
        }
        else
        {
            WriteChoice(json, shape);
        }

        json.WriteEndObject();
    }

    /// <summary>A document with a base may leave out or remove what the base gives.</summary>
    private static void WriteChoice(Utf8JsonWriter json, Shape shape)
    {
        json.WriteString("type", "object");
        json.WritePropertyName("if");
        json.WriteStartObject();
        json.WriteStartArray("required");
        json.WriteStringValue(BasedOn);
        json.WriteEndArray();
        json.WriteEndObject();
        json.WritePropertyName("then");
        json.WriteStartObject();
        new SchemaWriter(json, isOverlay: true).WriteShape(shape);
        json.WriteEndObject();
        json.WritePropertyName("else");
        json.WriteStartObject();
        new SchemaWriter(json, isOverlay: false).WriteShape(shape);
        json.WriteEndObject();
    }
}
