using System.Numerics;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;

namespace Boltup.Tests.Reports;

/// <summary>Predictions made by hand, one value per line.</summary>
internal static class TinyPrediction
{
    public static PredictionResult Of(double[] hz, Complex[] pressure, double[]? conditionPerLine = null, params string[] responses)
    {
        FrequencyAxis axis = FrequencyAxis.FromHertz(hz);
        string[] names = responses.Length == 0 ? ["driver ear"] : responses;
        ResponseSpectrum[] spectra = [.. names.Select(name => new ResponseSpectrum(name, "body.ear.p", Quantity.Pressure, "Pa", pressure))];
        var operation = new OperationResult(
            "2400 rpm", axis, Amplitude.Rms, spectra, [new JointForceSpectrum("front left", Direction.Z, "N", pressure)]);
        return new PredictionResult("Invented", axis, [operation], new Conditioning(conditionPerLine ?? [], 0.1), "scalar", []);
    }
}
