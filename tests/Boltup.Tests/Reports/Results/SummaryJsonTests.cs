using System.Text.Json;
using Boltup.Engine;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Prediction;
using Boltup.Reports.Results;

namespace Boltup.Tests.Reports.Results;

public class SummaryJsonTests
{
    [Fact]
    public void Write_TinyResult_HasTheseKeysInThisOrder()
    {
        using JsonDocument json = Write(TinyResult.Plain);

        string[] keys = [.. json.RootElement.EnumerateObject().Select(property => property.Name)];
        Assert.Equal(
            ["boltup", "title", "program_version", "kernels", "frequencies", "interface_condition", "levels", "targets", "diagnostics", "inputs", "cautions"], keys);
        Assert.Equal("results/1", json.RootElement.GetProperty("boltup").GetString());
        Assert.Equal("1.2.3", json.RootElement.GetProperty("program_version").GetString());
    }

    [Fact]
    public void Write_Conditioning_NamesTheWorstLine()
    {
        using JsonDocument json = Write(TinyResult.Plain);
        JsonElement condition = json.RootElement.GetProperty("interface_condition");

        Assert.Equal(8, condition.GetProperty("largest").GetDouble());
        Assert.Equal(50.5, condition.GetProperty("largest_at_hz").GetDouble());
        Assert.Equal(4, condition.GetProperty("median").GetDouble());
        Assert.Equal(0.25, condition.GetProperty("rotation_length_m").GetDouble());
        Assert.Equal(3, condition.GetProperty("per_line").GetArrayLength());
    }

    [Fact]
    public void Write_NothingJoined_HasNoConditioning()
    {
        using JsonDocument json = Write(TinyResult.Plain with { Conditioning = new Conditioning([], 1) });

        Assert.False(json.RootElement.TryGetProperty("interface_condition", out _));
    }

    [Fact]
    public void Write_Levels_AreOnePerOperationAndResponse()
    {
        using JsonDocument json = Write(TinyResult.Of(
            TinyResult.Operation("idle", Amplitude.Rms, TinyResult.Ear, TinyResult.Seat), TinyResult.Operation("full", Amplitude.Peak, TinyResult.Ear, TinyResult.Seat)));
        JsonElement levels = json.RootElement.GetProperty("levels");
        JsonElement first = levels[0];

        Assert.Equal(4, levels.GetArrayLength());
        Assert.Equal("ear, left", first.GetProperty("response").GetString());
        Assert.Equal("cabin.ear.p", first.GetProperty("dof").GetString());
        Assert.Equal("20 µPa", first.GetProperty("db_reference").GetString());
        Assert.Equal(20, first.GetProperty("strongest_line_hz").GetDouble());
        Assert.Equal(20 * Math.Log10(Math.Sqrt(25.01) / 20e-6), first.GetProperty("overall_db").GetDouble(), 6);
        Assert.Equal("peak", levels[2].GetProperty("amplitude").GetString());
    }

    [Fact]
    public void Write_DiagnosticsAndInputs_AreData()
    {
        var warning = new Diagnostic(EngineCodes.PartNotConnected, Severity.Warning, "part `a` is not connected");
        using JsonDocument json = Write(TinyResult.Plain with { Diagnostics = [warning] });

        Assert.Equal("ENG005", json.RootElement.GetProperty("diagnostics")[0].GetProperty("code").GetString());
        Assert.Equal(TinyResult.Input.Sha256, json.RootElement.GetProperty("inputs")[0].GetProperty("sha256").GetString());
        Assert.Equal(TinyResult.Input.File, json.RootElement.GetProperty("inputs")[0].GetProperty("file").GetString());
    }

    private static JsonDocument Write(PredictionResult result)
    {
        using var bytes = new MemoryStream();
        SummaryJson.Write(bytes, result, [TinyResult.Input], "1.2.3");
        return JsonDocument.Parse(bytes.ToArray());
    }
}
