using System.Globalization;
using Boltup.Engine.Coupling;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Geometry;
using Boltup.Engine.Parts;

namespace Boltup.Engine.Prediction;

/// <summary>Is everything joined, in the right place, and can the forces reach the responses?</summary>
internal static class ConnectionRules
{
    public static void Check(AssemblyModel assembly, DiagnosticBag found)
    {
        CheckEveryPartIsJoined(assembly, found);
        CheckForcesReachResponses(assembly, found);
        foreach (Joint joint in assembly.Joints)
        {
            CheckGap(joint, assembly, found);
        }
    }

    private static void CheckEveryPartIsJoined(AssemblyModel assembly, DiagnosticBag found)
    {
        if (assembly.Joints.Count == 0)
        {
            return;
        }

        foreach (PlacedPart part in assembly.Parts.Where(part => !assembly.Joints.Any(joint => Touches(joint, part.Name))))
        {
            found.Warning(
                EngineCodes.PartNotConnected,
                $"part `{part.Name}` is not connected: no joint names one of its points",
                part.Origin,
                "add the joint that is missing, or remove the part");
        }
    }

    private static void CheckForcesReachResponses(AssemblyModel assembly, DiagnosticBag found)
    {
        foreach (Operation operation in assembly.Operations)
        {
            HashSet<string> reached = Reached(assembly, operation.Forces.Select(set => set.Part));
            foreach (Response response in assembly.Responses.Where(response => !reached.Contains(response.Part)))
            {
                found.Error(
                    EngineCodes.ResponseNotReached,
                    $"response `{response.Name}` on part `{response.Part}` is not reached by the forces of operation `{operation.Name}`",
                    response.Origin,
                    "add the joint that is missing, or remove the response",
                    $"parts that the forces reach: {string.Join(", ", reached.Order(StringComparer.Ordinal).Select(part => $"`{part}`"))}");
            }
        }
    }

    private static HashSet<string> Reached(AssemblyModel assembly, IEnumerable<string> driven)
    {
        var reached = new HashSet<string>(driven);
        bool grows = true;
        while (grows)
        {
            grows = false;
            foreach (Joint joint in assembly.Joints.Where(joint => joint is { First.IsGround: false, Second.IsGround: false }))
            {
                bool first = reached.Contains(joint.First.Part!);
                bool second = reached.Contains(joint.Second.Part!);
                grows |= first != second && reached.Add(first ? joint.Second.Part! : joint.First.Part!);
            }
        }

        return reached;
    }

    private static void CheckGap(Joint joint, AssemblyModel assembly, DiagnosticBag found)
    {
        if (PositionOf(joint.First, assembly) is { } first
            && PositionOf(joint.Second, assembly) is { } second
            && (first - second).Length > assembly.JointGap)
        {
            found.Warning(
                EngineCodes.JointGap,
                string.Create(
                    CultureInfo.InvariantCulture,
                    $"joint `{joint.Name}`: `{joint.First}` and `{joint.Second}` are {1000 * (first - second).Length:G4} mm apart"),
                joint.Origin,
                "check which points belong together and how the parts are turned and moved; a distance that is meant goes into `joint_gap`",
                $"`{joint.First}` at {Text(first)}, `{joint.Second}` at {Text(second)}");
        }
    }

    private static string Text(Vector3d position) => string.Create(
        CultureInfo.InvariantCulture, $"[{1000 * position.X:G6} mm, {1000 * position.Y:G6} mm, {1000 * position.Z:G6} mm]");

    private static Vector3d? PositionOf(JointEnd end, AssemblyModel assembly) =>
        end.IsGround ? null : assembly.Parts.First(part => part.Name == end.Part).PositionOf(end.Point);

    private static bool Touches(Joint joint, string part) => joint.First.Part == part || joint.Second.Part == part;
}
