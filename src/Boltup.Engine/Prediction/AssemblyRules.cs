using Boltup.Engine.Coupling;
using Boltup.Engine.Diagnostics;

namespace Boltup.Engine.Prediction;

/// <summary>Everything about an assembly that can be judged before it is computed. Each rule collects; none stops the others.</summary>
public static class AssemblyRules
{
    /// <summary>Runs every rule.</summary>
    /// <param name="layout">The coupling layout with all responses and excitations added.</param>
    /// <returns>False when there is an error.</returns>
    public static bool Check(AssemblyModel assembly, CouplingLayout layout, DiagnosticBag diagnostics)
    {
        var found = new DiagnosticBag();
        SayWhenNothingIsAsked(assembly, found);
        ConnectionRules.Check(assembly, found);
        SourceRules.Check(assembly, layout, found);
        AxisRules.Check(assembly, found);
        MountRules.Check(assembly, found);
        foreach (PartLayout part in layout.Parts.Where(part => part.IsUsed))
        {
            FrfRules.Check(part, found);
        }

        diagnostics.AddRange(found.Items);
        return !found.HasErrors;
    }

    private static void SayWhenNothingIsAsked(AssemblyModel assembly, DiagnosticBag found)
    {
        bool hasForces = assembly.Operations.Count > 0;
        if (!hasForces || assembly.Responses.Count + assembly.Joints.Count == 0)
        {
            found.Warning(
                EngineCodes.NothingAsked,
                $"`{assembly.Title}` has no {(hasForces ? "responses and no joints" : "operations")}: there is nothing to predict",
                help: hasForces ? "add `responses`" : "add `operations` with forces");
        }
    }
}
