using System.Globalization;
using Boltup.Cli.Terminal;
using Boltup.Engine.Acoustics;
using Boltup.Engine.Prediction;

namespace Boltup.Cli.Commands;

/// <summary>Weighted vibration of people, with the exposure values of the directive and what they must not be taken for.</summary>
internal static class ExposureSummary
{
    public static void Print(Screen screen, PredictionResult result)
    {
        var cautions = new List<string>();
        foreach (OperationResult operation in result.Operations)
        {
            foreach (ResponseSpectrum response in operation.Responses.Where(response => response.Weighting is not null))
            {
                double power = PowerSpectrum.Of(response.Values, operation.Axis, operation.Amplitude).Weighted(response.Weighting!.Value).Sum();
                screen.Out.WriteLine(string.Create(
                    CultureInfo.InvariantCulture, $"{operation.Name}, {response.Name}: {response.Weighting}-weighted {Math.Sqrt(power):G3} {response.Unit} rms"));
                cautions.Add(Exposure.For(response.Weighting.Value)!.Caution);
            }
        }

        foreach (string caution in cautions.Distinct())
        {
            screen.Out.WriteLine(caution);
        }

        if (cautions.Count > 0)
        {
            screen.Out.WriteLine();
        }
    }
}
