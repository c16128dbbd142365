using Boltup.Config.Binding;
using Boltup.Config.Documents;
using Boltup.Engine.Coupling;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Evidence;
using Boltup.Engine.Identification;
using Boltup.Engine.Parts;
using Boltup.Engine.Spectra;

namespace Boltup.Config.Planning;

/// <summary>Plans what a bench document gives as evidence beyond the bench itself.</summary>
internal sealed class BenchExtrasPlanner(
    BenchDocument document, LoadOptions options, DataLibrary library, PointNames names, DiagnosticBag diagnostics)
{
    /// <summary>All of it, or null after an error.</summary>
    public BenchExtras? Plan(BenchModel bench)
    {
        SecondInstallation? second = document.Second is { } another ? PlanSecond(another, bench) : null;
        AssemblyPlan? assembly = document.Model is { } model ? PlanAssembly(model, bench) : null;
        RouteMeasurement?[] routes = diagnostics.HasErrors ? [] : [.. document.Routes.Select(route => PlanRoute(route, bench, assembly))];
        if (!diagnostics.HasErrors)
        {
            return new BenchExtras(second, assembly, document.Model?.Source.Value, routes!);
        }

        assembly?.Dispose();
        return null;
    }

    private SecondInstallation? PlanSecond(SecondInstallationDocument second, BenchModel bench)
    {
        if (new FrfPlanner(library, diagnostics).Plan("second installation", document.Points, second.InstalledFrfs, fillByReciprocity: false) is not { } installed)
        {
            return null;
        }

        Dof[] sensors = [.. second.Sensors.SelectMany(point => installed.Responses.Where(dof => dof.Point == point.Value).Order())];
        (Dof Sensor, Dof Force)[] missing =
            [.. sensors.SelectMany(sensor => bench.Interface.Select(force => (sensor, force))).Where(pair => !installed.HasFrf(pair.sensor, pair.force))];
        if (sensors.Length == 0 || missing.Length > 0)
        {
            diagnostics.Error(
                PlanCodes.ForceWithoutFrf,
                sensors.Length == 0
                    ? "the FRFs of the second installation hold no response at its sensors"
                    : $"the second installation lacks {missing.Length} FRFs, such as {missing[0].Sensor} / {missing[0].Force}",
                second.Sensors[0].Span,
                "FRFs are needed from every interface dof to every sensor of the second installation");
            return null;
        }

        return Read(second.Operations, sensors, bench.Axis) is { } measured
            ? new SecondInstallation(second.Title?.Value ?? "second installation", installed, sensors, measured)
            : null;
    }

    private (string, SpectrumSet)[]? Read(IReadOnlyList<BenchSpectraDocument> operations, IReadOnlyList<Dof> dofs, FrequencyAxis axis)
    {
        var planner = new BenchOperationPlanner(library, names, diagnostics);
        var measured = new List<(string, SpectrumSet)>();
        foreach (BenchSpectraDocument operation in operations)
        {
            if (planner.Plan(operation, dofs) is not { } read || axis.SharedWith(read.Columns[0].Axis) is not { } shared)
            {
                return null;
            }

            measured.Add((operation.Name.Value, LinePick.On(read.Columns[0], shared)));
        }

        return [.. measured];
    }

    private AssemblyPlan? PlanAssembly(BenchModelDocument model, BenchModel bench)
    {
        if (AssemblyPlanner.Plan(model.Assembly.FullPath, options, diagnostics) is not { } plan)
        {
            return null;
        }

        PlacedPart? source = plan.Assembly.Parts.FirstOrDefault(part => part.Name == model.Source.Value);
        Dof[] unjoined = [.. bench.Interface.Where(dof => source is null || !IsJoined(plan.Assembly.Joints, model.Source.Value, dof))];
        if (unjoined.Length == 0)
        {
            return plan;
        }

        diagnostics.Error(
            PlanCodes.InterfaceNotInAssembly,
            source is null
                ? $"`{model.Assembly.Written}` has no part `{model.Source}`"
                : $"`{model.Assembly.Written}` has no joint at {string.Join(", ", unjoined.Take(6).Select(dof => $"`{model.Source}.{dof}`"))}",
            model.Source.Span,
            source is null ? NearestName.Suggest(model.Source.Value, [.. plan.Assembly.Parts.Select(part => part.Name)]) : "name the points of the source as on the bench");
        plan.Dispose();
        return null;
    }

    private static bool IsJoined(IReadOnlyList<Joint> joints, string source, Dof dof) => joints.Any(joint =>
        new[] { joint.First, joint.Second }.Any(end => end.Part == source && end.Point == dof.Point)
        && joint.Directions.Any(direction => direction >= Direction.RX == dof.IsRotation));

    private RouteMeasurement? PlanRoute(RouteDocument route, BenchModel bench, AssemblyPlan? assembly)
    {
        MountPath[] mounts = route.Method.Value == ForceRoute.FreeVelocity || assembly is null ? [] : [.. MountsOf(assembly)];
        Dof[] dofs = [.. DofsOf(route.Method.Value, bench, mounts)];
        IPartModel? free = route.SourcePart is { } file ? PlanFreeSource(file, bench) : null;
        IEnumerable<BenchSpectraDocument> operations = route.Operations.Select(operation => route.Method.Value == ForceRoute.Direct
            ? operation with { Motion = new(Quantity.Force, operation.Name.Span) }
            : operation);
        return Read([.. operations], dofs, bench.Axis) is { } measured && (free is null) == (route.SourcePart is null)
            ? new RouteMeasurement(route.Name.Value, route.Method.Value, measured, free, mounts)
            : null;
    }

    /// <summary>What a route measures: both ends of the mounts; forces under the mounts where these are known; the interface itself.</summary>
    private static IEnumerable<Dof> DofsOf(ForceRoute route, BenchModel bench, MountPath[] mounts) => route switch
    {
        ForceRoute.MountStiffness => mounts.SelectMany(mount => mount.Mount.Directions.SelectMany(direction =>
            new[] { new Dof(mount.SourcePoint, direction), new Dof(mount.ReceiverPoint, direction) })),
        ForceRoute.Direct when mounts.Length > 0 => mounts.SelectMany(mount => mount.Mount.Directions.Select(direction => new Dof(mount.ReceiverPoint, direction))),
        _ => bench.Interface,
    };

    private IEnumerable<MountPath> MountsOf(AssemblyPlan assembly)
    {
        string source = document.Model!.Source.Value;
        foreach (Joint joint in assembly.Assembly.Joints.Where(joint => joint.Mount is not null))
        {
            if (joint.First.Part == source || joint.Second.Part == source)
            {
                (JointEnd ours, JointEnd theirs) = joint.First.Part == source ? (joint.First, joint.Second) : (joint.Second, joint.First);
                yield return new MountPath(joint.Mount!, ours.Point, theirs.Point);
            }
        }
    }

    private IPartModel? PlanFreeSource(FileReference file, BenchModel bench)
    {
        if (ConfigLoader.LoadPart(file.FullPath, options, diagnostics).Document is not { } part)
        {
            return null;
        }

        var placed = new PlacedPartDocument(new Marked<string>("free source", file.Span), file, Turned: null, Moved: null, part);
        if (new PartPlanner(library, diagnostics).Plan(placed)?.Model is not { } model)
        {
            return null;
        }

        Dof? missing = bench.Interface.FirstOrDefault(row => bench.Interface.Any(column => !model.HasFrf(row, column)));
        if (missing is not null)
        {
            diagnostics.Error(
                PlanCodes.ForceWithoutFrf, $"`{file.Written}` lacks FRFs at the interface dof `{missing}`", file.Span,
                "free velocity needs the square matrix of FRFs between all interface dofs of the source");
            return null;
        }

        return model;
    }
}
