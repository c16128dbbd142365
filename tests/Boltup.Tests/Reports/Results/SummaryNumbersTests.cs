using System.Numerics;
using System.Text.Json;
using Boltup.Engine.Prediction;
using Boltup.Reports.Results;

namespace Boltup.Tests.Reports.Results;

public class SummaryNumbersTests
{
    [Fact]
    public void Write_WithNumbersThatJsonDoesNotKnow_WritesNull()
    {
        JsonElement summary = Summarise(TinyPrediction.Of([10, 20, 30], [1, Complex.NaN, 2], [5, double.PositiveInfinity, double.NaN]));

        JsonElement condition = summary.GetProperty("interface_condition");
        Assert.Equal("[5, null, null]", condition.GetProperty("per_line").GetRawText());
        Assert.Equal(JsonValueKind.Null, condition.GetProperty("largest").ValueKind);
        JsonElement level = summary.GetProperty("levels")[0];
        Assert.Equal(JsonValueKind.Null, level.GetProperty("overall_db").ValueKind);
        Assert.Equal(30, level.GetProperty("strongest_line_hz").GetDouble());
    }

    private static JsonElement Summarise(PredictionResult result)
    {
        using var bytes = new MemoryStream();
        SummaryJson.Write(bytes, result, [], "0.0");
        return JsonDocument.Parse(bytes.ToArray()).RootElement;
    }
}
