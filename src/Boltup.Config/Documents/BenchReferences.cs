using Boltup.Config.Binding;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Evidence;
using Boltup.Engine.Identification;

namespace Boltup.Config.Documents;

/// <summary>Checks that the names within a bench file agree.</summary>
internal sealed class BenchReferences(BenchDocument bench, DiagnosticBag diagnostics)
{
    private readonly KnownNames _points = new("point", bench.Points.Select(point => point.Name.Value).Concat(bench.VirtualPoints.Select(point => point.Name.Value)));
    private readonly KnownNames _operations = new("operation", bench.Operations.Select(operation => operation.Name.Value));

    public void Check()
    {
        PointNodes.Check(bench.Points, diagnostics);
        VirtualPointBinder.Check(bench.VirtualPoints, bench.Points, diagnostics);
        foreach (Marked<string> name in bench.Interface.Concat(bench.Indicators).Concat(bench.Validation).Concat(bench.Second?.Sensors ?? []))
        {
            _points.Check(name.Value, name.Span, diagnostics);
        }

        CheckRoles();
        foreach (BenchSpectraDocument operation in (bench.Second?.Operations ?? []).Concat(bench.Routes.SelectMany(route => route.Operations)))
        {
            _operations.Check(operation.Name.Value, operation.Name.Span, diagnostics);
            RefuseFreePhase(operation);
        }

        CheckNoise();
        CheckModel();
    }

    private void CheckRoles()
    {
        foreach (Marked<string> sensor in bench.Validation)
        {
            if (bench.Indicators.FirstOrDefault(indicator => indicator.Value == sensor.Value) is { } indicator)
            {
                diagnostics.Error(ConfigCodes.ValidationIsIndicator,
                    $"`{sensor}` is an indicator and a validation sensor", sensor.Span,
                    "a sensor that took part in the identification cannot judge it: remove it from one of the lists",
                    $"as an indicator it is at {indicator.Span}");
            }
        }
    }

    private void RefuseFreePhase(BenchSpectraDocument operation)
    {
        if (operation.IsCrossSpectra || operation.Phase == PhaseReference.Free)
        {
            diagnostics.Error(ConfigCodes.NeedsOtherKey,
                $"`{operation.Name}` is compared line by line, and has no phase reference", operation.Name.Span,
                "give phase-referenced spectra with `file`, or `runs` with `phase: common`");
        }
    }

    private void CheckNoise()
    {
        if (bench.Solve.Value.UsesNoise && bench.InstalledFrfs.Any(file => file.Coherence is null))
        {
            diagnostics.Error(ConfigCodes.NoiseUnknown, "`truncated` without `below` needs the noise of the FRFs", bench.Solve.Span,
                "give `coherence` and `averages` with every file of `installed_frf`, or write `below: 0.01`");
        }
    }

    private void CheckModel()
    {
        if (bench.Model is null && bench.Routes.FirstOrDefault(route => route.Method.Value == ForceRoute.MountStiffness) is { } route)
        {
            diagnostics.Error(ConfigCodes.NeedsOtherKey, $"route `{route.Name}` needs the mounts of the bench", route.Method.Span,
                "give the bench as an assembly with `model: { assembly: bench.assembly.yaml, source: compressor }`");
        }
    }
}
