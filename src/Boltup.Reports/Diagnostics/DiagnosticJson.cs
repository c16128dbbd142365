using System.Text.Json;
using Boltup.Engine.Diagnostics;

namespace Boltup.Reports.Diagnostics;

/// <summary>Renders diagnostics for programs.</summary>
public static class DiagnosticJson
{
    /// <summary>Name and version of the shape.</summary>
    public const string Format = "diagnostics/1";

    /// <summary>Writes <c>{ "boltup": "diagnostics/1", "diagnostics": […] }</c>.</summary>
    public static void WriteDocument(Stream output, IReadOnlyList<Diagnostic> diagnostics)
    {
        using var json = new Utf8JsonWriter(output, JsonStyle.Options);
        json.WriteStartObject();
        json.WriteString("boltup", Format);
        WriteList(json, diagnostics);
        json.WriteEndObject();
    }

    /// <summary>Writes the property <c>diagnostics</c> of an open object.</summary>
    public static void WriteList(Utf8JsonWriter json, IReadOnlyList<Diagnostic> diagnostics)
    {
        json.WriteStartArray("diagnostics");
        foreach (Diagnostic diagnostic in diagnostics)
        {
            Write(json, diagnostic);
        }

        json.WriteEndArray();
    }

    private static void Write(Utf8JsonWriter json, Diagnostic diagnostic)
    {
        json.WriteStartObject();
        json.WriteString("code", diagnostic.Code.Code);
        json.WriteString("severity", DiagnosticText.WordOf(diagnostic.Severity));
        json.WriteString("message", diagnostic.Message);
        if (diagnostic.Span is { } span)
        {
            WriteSpan(json, span);
        }

        WriteStrings(json, "notes", diagnostic.Notes);
        WriteStrings(json, "helps", diagnostic.Helps);
        json.WriteEndObject();
    }

    private static void WriteSpan(Utf8JsonWriter json, SourceSpan span)
    {
        json.WriteString("file", span.File);
        if (span.Line > 0)
        {
            json.WriteNumber("line", span.Line);
            json.WriteNumber("column", Math.Max(span.Column, 1));
            json.WriteNumber("length", span.Length);
        }

        if (span.ByteOffset is { } offset)
        {
            json.WriteNumber("byte_offset", offset);
        }
    }

    private static void WriteStrings(Utf8JsonWriter json, string name, IReadOnlyList<string> texts)
    {
        if (texts.Count > 0)
        {
            json.WriteStartArray(name);
            foreach (string text in texts)
            {
                json.WriteStringValue(text);
            }

            json.WriteEndArray();
        }
    }
}
