using Boltup.Config.Binding;
using Boltup.Config.Documents;
using Boltup.Config.Yaml;
using Boltup.Engine;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Identification;
using Boltup.Engine.Parts;
using Boltup.Engine.Spectra;

namespace Boltup.Config.Planning;

/// <summary>Turns a loaded bench into a plan: data files opened, operational spectra read, axes agreed.</summary>
public sealed class BenchPlanner
{
    private readonly BenchDocument _document;
    private readonly LoadOptions _options;
    private readonly DiagnosticBag _diagnostics;
    private readonly DataLibrary _library;
    private readonly PointNames _names;

    private BenchPlanner(BenchDocument document, LoadOptions options, DiagnosticBag diagnostics)
    {
        (_document, _options, _diagnostics, _library) = (document, options, diagnostics, new DataLibrary(options, diagnostics));
        _names = new PointNames(document.Points, diagnostics);
    }

    /// <summary>Loads and plans a bench.</summary>
    /// <returns>The plan, or null after errors in <paramref name="diagnostics"/>.</returns>
    public static BenchPlan? Plan(string path, LoadOptions options, DiagnosticBag diagnostics)
    {
        LoadResult<BenchDocument> loaded = ConfigLoader.LoadBench(path, options, diagnostics);
        if (loaded.Document is not { } document)
        {
            return null;
        }

        var planner = new BenchPlanner(document, options, diagnostics);
        BenchPlan? plan = planner.Plan(loaded.FilesRead);
        if (plan is null)
        {
            planner._library.Dispose();
        }

        return plan;
    }

    private BenchPlan? Plan(IReadOnlyList<SourceFile> filesRead)
    {
        IReadOnlyList<FrfFileDocument> files = [.. _document.InstalledFrfs.Select(file => file.Frf)];
        MeasuredPart? data = new FrfPlanner(_library, _diagnostics).Plan("installed source", _document.Points, files, fillByReciprocity: false);
        var virtualPoints = new VirtualPointPlanner(_document.VirtualPoints, _document.Points, _diagnostics);
        if (virtualPoints.Plan(data) is not { } installed)
        {
            return null;
        }

        Dof[] forces = [.. _document.Interface.SelectMany(point => _document.Directions.Select(direction => new Dof(point.Value, direction.Value)))];
        Dof[] indicators = SensorsAt(_document.Indicators, installed, motionOnly: true);
        Dof[] validation = SensorsAt(_document.Validation, installed, motionOnly: false);
        CheckCompleteness(installed, forces, [.. indicators, .. validation]);
        CheckCount(forces, indicators, validation);
        if (_diagnostics.HasErrors || PlanOperations([.. indicators, .. validation]) is not { } operations
            || AxisOf(installed, operations) is not { } axis)
        {
            return null;
        }

        string title = _document.Title?.Value ?? Path.GetFileName(_document.Source.DisplayPath);
        var bench = new BenchModel(
            title, axis, installed, forces, indicators, validation, [.. operations.Select(operation => OnAxis(operation, axis))], _document.Solve.Value);
        bench = bench with { VirtualPoints = virtualPoints.PointsOf(data!) ?? [], Data = data };
        bench = bench with { Coherence = new CoherencePlanner(_document, _library, _names, _diagnostics).Plan(bench) };
        BenchExtras? extras = _diagnostics.HasErrors ? null : new BenchExtrasPlanner(_document, _options, _library, _names, _diagnostics).Plan(bench);
        return extras is null ? null : new BenchPlan(_document, bench, extras, [.. filesRead, .. extras.Inputs, .. _library.Files], _library);
    }

    /// <summary>Every direction of a point that the FRFs hold.</summary>
    private Dof[] SensorsAt(IReadOnlyList<Marked<string>> points, IPartModel installed, bool motionOnly)
    {
        var sensors = new List<Dof>();
        foreach (Marked<string> point in points)
        {
            Dof[] found = [.. installed.Responses.Where(dof => dof.Point == point.Value && (dof.IsMotion || !motionOnly)).Order()];
            sensors.AddRange(found);
            if (found.Length == 0)
            {
                _diagnostics.Error(
                    PlanCodes.SensorWithoutFrf,
                    $"the installed FRFs hold no response at `{point}`",
                    point.Span,
                    "correct the node of the point, name another file, or remove the sensor");
            }
        }

        return [.. sensors];
    }

    private void CheckCompleteness(IPartModel installed, Dof[] forces, Dof[] sensors)
    {
        foreach (Dof force in forces)
        {
            Dof[] missing = [.. sensors.Where(sensor => !installed.HasFrf(sensor, force))];
            if (missing.Length > 0)
            {
                Marked<string> point = _document.Interface.First(each => each.Value == force.Point);
                _diagnostics.Error(
                    PlanCodes.ForceWithoutFrf,
                    missing.Length == sensors.Length
                        ? $"there is no installed FRF from the interface dof `{force}`"
                        : $"the installed FRFs from `{force}` are missing at {missing.Length} of {sensors.Length} sensor dofs",
                    point.Span,
                    "every interface dof must be excited, and every sensor measured: an interface dof that is left out is no force that is zero",
                    $"missing at {string.Join(", ", missing.Take(8).Select(dof => $"`{dof}`"))}{(missing.Length > 8 ? ", …" : "")}");
            }
        }
    }

    private void CheckCount(Dof[] forces, Dof[] indicators, Dof[] validation)
    {
        SourceSpan span = _document.Indicators[0].Span;
        if (indicators.Length < forces.Length)
        {
            _diagnostics.Error(
                PlanCodes.FewIndicators,
                $"{indicators.Length} indicator dofs cannot tell {forces.Length} forces apart",
                span,
                $"add sensors: at least {forces.Length} dofs, better twice as many (ISO 20270 asks for more indicators than forces)");
        }
        else if (indicators.Length == forces.Length)
        {
            _diagnostics.Warning(
                PlanCodes.NotOverDetermined,
                $"as many indicator dofs as forces ({forces.Length}): every error of a sensor goes into the forces unseen",
                span,
                "add sensors, better twice as many dofs as forces");
        }

        if (validation.Length == 0)
        {
            _diagnostics.Warning(
                EngineCodes.NoValidation,
                "no sensor is left for validation: nothing judges the forces",
                span,
                "name at least one point with `validation`");
        }
    }

    private BenchOperation[]? PlanOperations(Dof[] sensors)
    {
        var planner = new BenchOperationPlanner(_library, _names, _diagnostics);
        BenchOperation[] operations = [.. _document.Operations.Select(operation => planner.Plan(operation, sensors)).OfType<BenchOperation>()];
        return operations.Length < _document.Operations.Count ? null : operations;
    }

    /// <summary>The lines that all have, within what the document asks for.</summary>
    private FrequencyAxis? AxisOf(IPartModel installed, BenchOperation[] operations)
    {
        FrequencyAxis axis = _document.Frequencies?.ToAxis() ?? installed.Axis!;
        foreach (BenchOperation operation in operations)
        {
            FrequencyAxis? both = axis.SharedWith(operation.Columns[0].Axis);
            if (both is null)
            {
                _diagnostics.Error(
                    EngineCodes.NoCommonAxis,
                    $"operation `{operation.Name}` has no frequency line in common with what was before it",
                    operation.Origin,
                    "process FRFs and operational spectra with the same resolution",
                    $"so far: {axis}",
                    $"`{operation.Name}`: {operation.Columns[0].Axis}");
                return null;
            }

            axis = both;
        }

        // Motion at 0 Hz is no acceleration: that line says nothing of forces.
        return axis.FirstHz == 0 ? axis.Within(double.Epsilon, axis.LastHz) : axis;
    }

    private static BenchOperation OnAxis(BenchOperation operation, FrequencyAxis axis) => operation with
    {
        Columns = [.. operation.Columns.Select(set => LinePick.On(set, axis))],
        Runs = operation.Runs?.Select(set => LinePick.On(set, axis)).ToArray(),
    };
}
