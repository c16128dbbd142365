using System.Buffers;
using System.Buffers.Binary;
using System.Text;
using System.Text.Json;
using Boltup.Engine.Prediction;

namespace Boltup.Reports.Html;

/// <summary>The numbers of the charts as JSON: frequencies and levels are base64 of little-endian single precision.</summary>
internal static class PageData
{
    public static string Json(ReportPage page, PredictionResult result)
    {
        var buffer = new ArrayBufferWriter<byte>();

        // The default encoder leaves no `<`, so that no name can close the script element that holds the data.
        using (var json = new Utf8JsonWriter(buffer))
        {
            json.WriteStartObject();
            json.WriteStartArray("axes");
            foreach (OperationResult operation in result.Operations)
            {
                json.WriteStringValue(Base64([.. operation.Axis.Hz.ToArray().Select(hz => (float)hz)]));
            }

            json.WriteEndArray();
            json.WriteStartArray("charts");
            foreach (PageChart chart in page.Charts)
            {
                WriteChart(json, chart);
            }

            json.WriteEndArray();
            json.WriteEndObject();
        }

        return Encoding.UTF8.GetString(buffer.WrittenSpan);
    }

    private static void WriteChart(Utf8JsonWriter json, PageChart chart)
    {
        json.WriteStartObject();
        json.WriteString("reference", chart.Reference);
        json.WriteStartArray("lines");
        foreach (PageLine line in chart.Lines)
        {
            json.WriteStartObject();
            json.WriteString("name", line.Operation);
            json.WriteNumber("axis", line.Axis);
            json.WriteString("levels", Base64(line.Decibels));
            json.WriteEndObject();
        }

        json.WriteEndArray();
        json.WriteEndObject();
    }

    private static string Base64(IReadOnlyList<float> values)
    {
        byte[] bytes = new byte[4 * values.Count];
        for (int i = 0; i < values.Count; i++)
        {
            BinaryPrimitives.WriteSingleLittleEndian(bytes.AsSpan(4 * i), values[i]);
        }

        return Convert.ToBase64String(bytes);
    }
}
