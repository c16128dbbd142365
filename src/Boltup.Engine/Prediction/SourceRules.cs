using Boltup.Engine.Coupling;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Parts;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Prediction;

/// <summary>What blocked forces may and may not be used for.</summary>
internal static class SourceRules
{
    public static void Check(AssemblyModel assembly, CouplingLayout layout, DiagnosticBag found)
    {
        foreach (Operation operation in assembly.Operations)
        {
            foreach (ForceSet set in operation.Forces.Where(set => set.Kind == ForceKind.Blocked))
            {
                HashSet<string> joined = JoinedPoints(assembly, set.Part);
                CheckForcesAreAtJoints(operation, set, joined, found);
                CheckNoResponseInside(assembly, operation, set, joined, found);
                CheckComplete(operation, set, layout[set.Part], found);
            }
        }
    }

    private static HashSet<string> JoinedPoints(AssemblyModel assembly, string part) =>
        [.. assembly.Joints.SelectMany(joint => new[] { joint.First, joint.Second }).Where(end => end.Part == part).Select(end => end.Point)];

    private static void CheckForcesAreAtJoints(Operation operation, ForceSet set, HashSet<string> joined, DiagnosticBag found)
    {
        string[] elsewhere = [.. set.Dofs.Select(dof => dof.Point).Distinct().Where(point => !joined.Contains(point))];
        if (elsewhere.Length > 0)
        {
            found.Error(
                EngineCodes.BlockedForceOffInterface,
                $"operation `{operation.Name}`: blocked forces of `{set.Part}` act at {Names(elsewhere)}, which carr{(elsewhere.Length == 1 ? "ies" : "y")} no joint",
                set.Origin,
                "add the joint that is missing; a force that really acts there belongs into `applied_forces`",
                $"joined points of `{set.Part}`: {Names(joined)}");
        }
    }

    private static void CheckNoResponseInside(
        AssemblyModel assembly, Operation operation, ForceSet set, HashSet<string> joined, DiagnosticBag found)
    {
        foreach (Response response in assembly.Responses.Where(r => r.Part == set.Part && !joined.Contains(r.Dof.Point)))
        {
            found.Error(
                EngineCodes.ResponseInsideSource,
                $"response `{response.Name}` lies inside the source `{set.Part}` of operation `{operation.Name}`: blocked forces do not reproduce motion there",
                response.Origin,
                "ask for a response on another part or at an interface point of the source; motion inside the source needs its internal forces as `applied_forces`");
        }
    }

    private static void CheckComplete(Operation operation, ForceSet set, PartLayout part, DiagnosticBag found)
    {
        Dof[] missing =
            [.. part.Columns.Take(part.InterfaceCount)
                .SelectMany(column => column.Terms)
                .Select(term => term.Dof)
                .Distinct()
                .Except(set.Dofs)];
        if (missing.Length > 0)
        {
            found.Warning(
                EngineCodes.ForcesIncomplete,
                $"operation `{operation.Name}`: no blocked force of `{set.Part}` at {Names(missing.Select(dof => dof.ToString()))}; taken as zero",
                set.Origin,
                "identify the blocked forces in all directions in which the source is joined");
        }
    }

    private static string Names(IEnumerable<string> names) =>
        string.Join(", ", names.Order(StringComparer.Ordinal).Select(name => $"`{name}`"));
}
