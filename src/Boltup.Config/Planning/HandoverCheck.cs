using System.Globalization;
using Boltup.Config.Documents;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Geometry;
using Boltup.Engine.Spectra;

namespace Boltup.Config.Planning;

/// <summary>Checks that handed-over blocked forces are applied where they were identified: points, axes, side of the mounts, band.</summary>
internal sealed class HandoverCheck(AssemblyDocument assembly, ForceDocument force, ForcesDocument handover, DiagnosticBag diagnostics)
{
    /// <summary>Largest difference of a unit vector's component: half a degree.</summary>
    private const double AxesTolerance = 0.0087;

    private readonly PartDocument _part = assembly.FindPart(force.Part.Value)!.Document!;

    /// <param name="axis">Lines of the forces.</param>
    public void Run(FrequencyAxis axis)
    {
        CheckPlaces();
        CheckSide();
        CheckBand(axis);
    }

    private void CheckPlaces()
    {
        var apart = new List<(PointDocument Given, Vector3d Offset)>();
        foreach (PointDocument given in handover.Points)
        {
            PointDocument? own = _part.Points.FirstOrDefault(point => point.Name.Value == given.Name.Value);
            if (own is null)
            {
                SayNoPoint(given);
                continue;
            }

            CheckAxes(given, own);
            if (given.At is { } there && own.At is { } here && (there.Value - here.Value).Length > assembly.JointGapM)
            {
                apart.Add((given, there.Value - here.Value));
            }
        }

        if (apart.Count > 0)
        {
            SayApart(apart);
        }
    }

    /// <summary>A lumped part has points that its document need not list; data alone may name them too.</summary>
    private void SayNoPoint(PointDocument given)
    {
        if (_part.KnownPoints is { } known && !known.Contains(given.Name.Value))
        {
            diagnostics.Error(
                PlanCodes.ForcesElsewhere,
                $"the blocked forces act at `{given.Name}`, and part `{force.Part}` has no such point",
                force.File.Span,
                "name the points of the part as on the bench, or apply the forces to the part that they were identified on",
                Binding.Words.Known($"points of `{force.Part}`", known));
        }
    }

    private void CheckAxes(PointDocument given, PointDocument own)
    {
        Rotation there = given.Axes?.Value ?? Rotation.None, here = own.Axes?.Value ?? Rotation.None;
        bool differ = new Vector3d[] { new(1, 0, 0), new(0, 1, 0), new(0, 0, 1) }
            .Any(unit => (there.Apply(unit) - here.Apply(unit)).Length > AxesTolerance);
        if (differ)
        {
            diagnostics.Error(
                PlanCodes.ForcesElsewhere,
                $"the axes of `{given.Name}` on the bench are not those of part `{force.Part}`: forces along x would act along another direction",
                force.File.Span,
                "give the point of the part the axes of the bench, or identify in the axes of the part",
                $"on the bench: {given.Name.Span}");
        }
    }

    private void SayApart(List<(PointDocument Given, Vector3d Offset)> apart)
    {
        Vector3d common = apart[0].Offset;
        bool isMoved = apart.Count == handover.Points.Count && apart.TrueForAll(point => (point.Offset - common).Length <= assembly.JointGapM);
        string[] offsets = [.. apart.Select(point => string.Create(CultureInfo.InvariantCulture, $"`{point.Given.Name}` by {Millimetres(point.Offset)}"))];
        if (isMoved)
        {
            diagnostics.Warning(
                PlanCodes.ForcesElsewhere,
                $"all points of the bench lie {Millimetres(common)} from those of part `{force.Part}`",
                force.File.Span,
                "harmless if only the origins differ; if the forces were identified below the mounts and are applied above them, they are forces of another source");
        }
        else
        {
            diagnostics.Error(
                PlanCodes.ForcesElsewhere,
                $"the blocked forces were identified at other places than the points of part `{force.Part}`",
                force.File.Span,
                "correct the positions of the part or of the bench: a force at another lever arm is another moment",
                $"bench minus part: {string.Join(", ", offsets)}");
        }
    }

    private static string Millimetres(Vector3d offset) =>
        string.Create(CultureInfo.InvariantCulture, $"[{1e3 * offset.X:0.#} mm, {1e3 * offset.Y:0.#} mm, {1e3 * offset.Z:0.#} mm]");

    private void CheckSide()
    {
        if (handover.MountsBelongToSource is not { } inSource)
        {
            return;
        }

        foreach (JointDocument joint in assembly.Joints.Where(TouchesForces))
        {
            bool goesThroughMount = joint.Mount is not null;
            if (goesThroughMount && inSource)
            {
                diagnostics.Warning(
                    PlanCodes.ForcesElsewhere,
                    $"the blocked forces were identified below the mounts, and joint `{joint.Name}` goes through a mount: it would be there twice",
                    joint.Mount!.Span,
                    "join rigidly below the mounts of the source, or identify above them");
            }
            else if (!goesThroughMount && !inSource)
            {
                diagnostics.Warning(
                    PlanCodes.ForcesElsewhere,
                    $"the blocked forces were identified above the mounts, and joint `{joint.Name}` is rigid: the mounts are missing",
                    joint.Name.Span,
                    "join through the mounts, unless the source is really bolted down");
            }
        }
    }

    private bool TouchesForces(JointDocument joint) => new[] { joint.First, joint.Second }
        .Any(end => end.Part == force.Part.Value && handover.Points.Any(point => point.Name.Value == end.Point));

    private void CheckBand(FrequencyAxis axis)
    {
        double[] outside = [.. axis.Hz.ToArray().Where(hz => hz < handover.FromHz * (1 - FrequencyAxis.RelativeTolerance) || hz > handover.ToHz * (1 + FrequencyAxis.RelativeTolerance))];
        if (outside.Length > 0)
        {
            diagnostics.Warning(
                PlanCodes.OutsideForceBand,
                string.Create(CultureInfo.InvariantCulture, $"the blocked forces hold from {handover.FromHz} to {handover.ToHz} Hz only; {outside.Length} of {axis.Count} lines are outside"),
                force.Operation?.Span ?? force.File.Span,
                "restrict `frequencies` of the assembly to the band",
                handover.Because is { } reason ? [$"the supplier says: {reason}", $"at {FrequencyList.Of(outside)}"] : [$"at {FrequencyList.Of(outside)}"]);
        }
    }
}
