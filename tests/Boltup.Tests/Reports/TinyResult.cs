using System.Numerics;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;
using Boltup.Reports.Results;

namespace Boltup.Tests.Reports;

/// <summary>A prediction of three lines that can be checked by hand; all of it invented.</summary>
internal static class TinyResult
{
    public static readonly FrequencyAxis Axis = FrequencyAxis.FromHertz([20, 50.5, 1000]);

    public static readonly InputFingerprint Input = new("configs/tiny.assembly.yaml", new string('a', 64));

    /// <summary>3-4-5 triangles: rms levels of the pressure are 5, 0 and 1 Pa.</summary>
    public static ResponseSpectrum Ear => new(
        "ear, left", "cabin.ear.p", Quantity.Pressure, "Pa", [new Complex(3, 4), Complex.Zero, new Complex(-0.1, 1e-7)]);

    public static ResponseSpectrum Seat => new(
        "seat", "body.seat.z", Quantity.Acceleration, "m/s²", [new Complex(1, 0), new Complex(0, 1), new Complex(0.1, 0.2)]);

    public static JointForceSpectrum Force => new("front", Direction.Z, "N", [new Complex(1, -2), new Complex(0.5, 0), new Complex(1.0 / 3, 0)]);

    public static PredictionResult Of(params OperationResult[] operations) => new(
        "Tiny µ assembly", Axis, operations, new Conditioning([2, 8, 4], 0.25), "scalar", []);

    public static OperationResult Operation(string name = "idle", Amplitude amplitude = Amplitude.Rms, params ResponseSpectrum[] responses) =>
        new(name, Axis, amplitude, responses, [Force]);

    public static PredictionResult Plain => Of(Operation(responses: [Ear, Seat]));

    public static IReadOnlyList<string>? Write(string folder, DiagnosticBag diagnostics, bool pictures = false, PredictionResult? result = null) =>
        ResultWriter.Write(result ?? Plain, [Input], folder, new ResultOptions("1.2.3", pictures), diagnostics);
}
