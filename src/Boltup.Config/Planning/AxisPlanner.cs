using Boltup.Config.Documents;
using Boltup.Engine;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Parts;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;

namespace Boltup.Config.Planning;

/// <summary>
/// Decides at which lines the assembly is coupled: those it asks for; otherwise those that its parts share; otherwise, when all parts are
/// models, those of its forces.
/// </summary>
internal static class AxisPlanner
{
    /// <summary>The axis, or null after an error.</summary>
    public static FrequencyAxis? Plan(
        AssemblyDocument assembly, IReadOnlyList<PlacedPart> parts, IReadOnlyList<Operation> operations, DiagnosticBag diagnostics)
    {
        if (assembly.Frequencies is { } asked)
        {
            return asked.ToAxis();
        }

        PlacedPart[] measured = [.. parts.Where(part => part.Model.Axis is not null)];
        return measured.Length > 0 ? Shared(measured, diagnostics) : OfForces(assembly, operations, diagnostics);
    }

    private static FrequencyAxis? Shared(PlacedPart[] measured, DiagnosticBag diagnostics)
    {
        FrequencyAxis shared = measured[0].Model.Axis!;
        foreach (PlacedPart part in measured.Skip(1))
        {
            FrequencyAxis? both = shared.SharedWith(part.Model.Axis!);
            if (both is null)
            {
                diagnostics.Error(
                    EngineCodes.NoCommonAxis,
                    $"part `{part.Name}` has no frequency line in common with the parts before it",
                    part.Origin,
                    "give `frequencies` in the assembly to interpolate the FRFs to lines of your choice",
                    [.. measured.Select(each => $"`{each.Name}`: {each.Model.Axis}")]);
                return null;
            }

            shared = both;
        }

        return shared;
    }

    private static FrequencyAxis? OfForces(
        AssemblyDocument assembly, IReadOnlyList<Operation> operations, DiagnosticBag diagnostics)
    {
        double[] lines =
            [.. operations.SelectMany(operation => operation.Forces).SelectMany(set => set.Axis.Hz.ToArray()).Distinct().Order()];
        if (lines.Length > 0)
        {
            return FrequencyAxis.FromHertz(lines);
        }

        diagnostics.Error(
            PlanCodes.FrequenciesNeeded,
            "nothing says at which frequencies to compute: all parts are models, and no operation has forces",
            new SourceSpan(assembly.Source.DisplayPath),
            "add `frequencies: { from: 10 Hz, to: 500 Hz, step: 1 Hz }`");
        return null;
    }
}
