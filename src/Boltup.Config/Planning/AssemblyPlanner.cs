using Boltup.Config.Documents;
using Boltup.Config.Pinning;
using Boltup.Config.Yaml;
using Boltup.Engine.Coupling;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Mounts;
using Boltup.Engine.Parts;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;

namespace Boltup.Config.Planning;

/// <summary>Turns a loaded assembly into a plan: data files opened (headers only, but for forces and tables), axes agreed.</summary>
public sealed class AssemblyPlanner
{
    private readonly AssemblyDocument _document;
    private readonly DiagnosticBag _diagnostics;
    private readonly DataLibrary _library;

    private AssemblyPlanner(AssemblyDocument document, LoadOptions options, DiagnosticBag diagnostics) =>
        (_document, _diagnostics, _library) = (document, diagnostics, new DataLibrary(options, diagnostics));

    /// <summary>Loads and plans an assembly.</summary>
    /// <returns>The plan, or null after errors in <paramref name="diagnostics"/>.</returns>
    public static AssemblyPlan? Plan(string path, LoadOptions options, DiagnosticBag diagnostics)
    {
        LoadResult<AssemblyDocument> loaded = ConfigLoader.LoadAssembly(path, options, diagnostics);
        return loaded.Document is { } document ? Plan(document, loaded.FilesRead, options, diagnostics) : null;
    }

    private static AssemblyPlan? Plan(
        AssemblyDocument document, IReadOnlyList<SourceFile> filesRead, LoadOptions options, DiagnosticBag diagnostics)
    {
        var planner = new AssemblyPlanner(document, options, diagnostics);
        AssemblyModel? assembly = planner.Plan();
        if (assembly is not null && planner.ArePinsKept(options))
        {
            return new AssemblyPlan(document, assembly, filesRead, planner._library);
        }

        planner._library.Dispose();
        return null;
    }

    private bool ArePinsKept(LoadOptions options)
    {
        var found = new DiagnosticBag();
        if (options.ChecksPins)
        {
            new PinCheck([.. _library.Files], options, found).Run(_document);
        }

        _diagnostics.AddRange(found.Items);
        return !found.HasErrors;
    }

    private AssemblyModel? Plan()
    {
        var parts = new PartPlanner(_library, _diagnostics);
        PlacedPart?[] placed = [.. _document.Parts.Select(parts.Plan)];
        var mounts = new MountPlanner(_document, _library, _diagnostics);
        Joint?[] joints = [.. _document.Joints.Select(joint => PlanJoint(joint, mounts))];
        var forces = new ForcePlanner(_document, _library, _diagnostics);
        Operation?[] operations = [.. _document.Operations.Select(forces.Plan)];
        if (_diagnostics.HasErrors || AxisPlanner.Plan(_document, placed!, operations!, _diagnostics) is not { } axis)
        {
            return null;
        }

        return new AssemblyModel(
            _document.Title?.Value ?? Path.GetFileName(_document.Source.DisplayPath),
            axis,
            placed!,
            joints!,
            operations!,
            [.. _document.Responses.Select(PlanResponse)])
        {
            JointGap = _document.JointGapM,
            Targets = [.. _document.Targets.Select(target => target.ToTarget())],
        };
    }

    private static Joint? PlanJoint(JointDocument document, MountPlanner mounts)
    {
        JointEnd first = PlanEnd(document.First);
        JointEnd second = PlanEnd(document.Second);
        if (document.Mount is null)
        {
            Direction[] directions = [.. document.Rigid.Select(direction => direction.Value).Order()];
            return Joint.Rigid(document.Name.Value, first, second, directions) with { Origin = document.Name.Span };
        }

        return mounts.Plan(document.Mount.Value) is MountLaw law
            ? Joint.Through(law, document.Name.Value, first, second) with { Origin = document.Name.Span, MountName = document.Mount.Value }
            : null;
    }

    private static JointEnd PlanEnd(JointEndDocument end) => end.IsGround ? JointEnd.Ground : new JointEnd(end.Part, end.Point!);

    private static Response PlanResponse(ResponseDocument document) =>
        new(document.Name.Value, document.At.Value.Part, document.At.Value.Dof, document.Quantity)
        {
            Origin = document.At.Span,
            Weighting = document.Weighting?.Value,
        };
}
