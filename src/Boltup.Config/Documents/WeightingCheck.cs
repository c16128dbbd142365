using Boltup.Config.Binding;
using Boltup.Engine.Acoustics;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Spectra;

namespace Boltup.Config.Documents;

/// <summary>Checks that weightings fit the quantities of responses.</summary>
internal static class WeightingCheck
{
    public static void Run(AssemblyDocument assembly, DiagnosticBag diagnostics)
    {
        foreach (ResponseDocument response in assembly.Responses)
        {
            Check(response.Weighting, response, diagnostics);
        }

        foreach (TargetDocument target in assembly.Targets)
        {
            if (assembly.Responses.FirstOrDefault(response => response.Name.Value == target.Response.Value) is { } response)
            {
                Check(target.Weighting, response, diagnostics);
            }
        }
    }

    private static void Check(Marked<FrequencyWeighting>? weighting, ResponseDocument response, DiagnosticBag diagnostics)
    {
        if (weighting is not null && !weighting.Value.Fits(response.Quantity))
        {
            diagnostics.Error(ConfigCodes.WeightingDoesNotFit,
                $"weighting {weighting.Value} is for {(weighting.Value.IsOfVibration() ? "acceleration" : "sound pressure")}, and response `{response.Name}` is none",
                weighting.Span,
                response.Quantity == Quantity.Pressure ? "sound takes A, C or Z" : "acceleration takes Wk, Wd, Wh or Z; other motion Z");
        }
    }
}
