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
        ConnectionRules.Check(assembly, found);
        SourceRules.Check(assembly, layout, found);
        AxisRules.Check(assembly, found);
        foreach (PartLayout part in layout.Parts.Where(part => part.IsUsed))
        {
            FrfRules.Check(part, found);
        }

        diagnostics.AddRange(found.Items);
        return !found.HasErrors;
    }
}
